/**
 * A note cut into blocks with exact offsets. Markdown by markdown-it's block rules; plain text at blank lines.
 * What is no prose (code, front matter, link targets, HTML) is blanked out, so that every offset stays what it is in the file.
 */

import MarkdownIt from "markdown-it";
import type { Span } from "../model/span.ts";

export interface Block extends Span {
  readonly kind: "heading" | "prose" | "item" | "table";
  /** The block's text with everything that is not prose blanked; same length as the span. */
  readonly text: string;
  /** Of a heading: 1 to 6. */
  readonly level?: number;
}

const markdown = new MarkdownIt({ html: true }).disable(["code", "reference"]);

function lineStarts(text: string): number[] {
  const starts = [0];
  for (let i = text.indexOf("\n"); i >= 0; i = text.indexOf("\n", i + 1)) starts.push(i + 1);
  return starts;
}

/** End of a front matter block at the top of the file, or 0. */
function frontMatterEnd(text: string): number {
  if (!text.startsWith("---\n") && !text.startsWith("---\r\n")) return 0;
  const close = /\n(?:---|\.\.\.)[ \t]*(?:\r?\n|$)/g;
  close.lastIndex = 3;
  const found = close.exec(text);
  return found ? found.index + found[0].length : 0;
}

/** Blanks `text[from, to)`. */
function blank(characters: string[], from: number, to: number): void {
  for (let i = from; i < to && i < characters.length; i++) if (characters[i] !== "\n") characters[i] = " ";
}

/** Blanks code spans, HTML comments and tags, and the targets of links; one pass, left to right. */
export function maskInline(text: string): string {
  if (!/[`<\]]/.test(text)) return text;
  const characters = text.split("");
  let i = 0;
  while (i < text.length) {
    const c = text[i];
    if (c === "`") {
      let ticks = 1;
      while (text[i + ticks] === "`") ticks++;
      const close = text.indexOf("`".repeat(ticks), i + ticks);
      if (close > 0 && text[close + ticks] !== "`") {
        blank(characters, i, close + ticks);
        i = close + ticks;
      } else i += ticks;
    } else if (c === "<" && text.startsWith("<!--", i)) {
      const close = text.indexOf("-->", i + 4);
      const end = close < 0 ? text.length : close + 3;
      blank(characters, i, end);
      i = end;
    } else if (c === "<" && /[a-z/]/i.test(text[i + 1] ?? "")) {
      const close = text.indexOf(">", i);
      const open = text.indexOf("<", i + 1);
      if (close > 0 && close - i < 200 && (open < 0 || open > close)) {
        blank(characters, i, close + 1);
        i = close + 1;
      } else i++;
    } else if (c === "]" && text[i + 1] === "(" && /^\]\((?:https?:|[./#]|mailto:)/.test(text.slice(i, i + 10))) {
      const close = text.indexOf(")", i);
      const end = close < 0 ? i + 1 : close + 1;
      blank(characters, i + 1, end);
      i = end;
    } else i++;
  }
  return characters.join("");
}

function block(kind: Block["kind"], text: string, start: number, end: number, level?: number): Block {
  let last = end;
  while (last > start && (text[last - 1] === "\n" || text[last - 1] === "\r")) last--;
  return {
    kind,
    start,
    end: last,
    text: maskInline(text.slice(start, last)),
    ...(level === undefined ? {} : { level }),
  };
}

function markdownBlocks(text: string): Block[] {
  const skip = frontMatterEnd(text);
  const body = skip > 0 ? text.slice(0, skip).replace(/[^\n]/g, " ") + text.slice(skip) : text;
  const starts = lineStarts(body);
  const at = (line: number): number => starts[line] ?? body.length;
  const blocks: Block[] = [];
  let items = 0;
  let tableEnd = -1;
  // Block rules only: the inline rules of markdown-it give no offsets, and nothing here needs them.
  const state = new markdown.block.State(body, markdown, {}, []);
  markdown.block.tokenize(state, state.line, state.lineMax);
  for (const token of state.tokens) {
    if (token.type === "list_item_open") items++;
    if (token.type === "list_item_close") items--;
    if (!token.map) continue;
    const [first, last] = token.map;
    if (token.type === "table_open") {
      tableEnd = last;
      blocks.push(block("table", body, at(first), at(last)));
    }
    if (first < tableEnd) continue;
    if (token.type === "heading_open")
      blocks.push(block("heading", body, at(first), at(last), Number(token.tag.slice(1))));
    if (token.type === "paragraph_open") blocks.push(block(items > 0 ? "item" : "prose", body, at(first), at(last)));
  }
  return blocks;
}

function plainBlocks(text: string): Block[] {
  const blocks: Block[] = [];
  const gap = /\n[ \t\r]*\n/g;
  let start = 0;
  for (let found = gap.exec(text); ; found = gap.exec(text)) {
    const end = found ? found.index : text.length;
    if (text.slice(start, end).trim() !== "") {
      const body = text.slice(start, end);
      // A short single line without a full stop or a number with a unit is a heading.
      const heading =
        !body.trim().includes("\n") &&
        body.trim().length < 80 &&
        !/[.;,]\s*$/.test(body) &&
        !/\d\s?(?:g|mg|mL|mmol|mol|L)\b/.test(body);
      blocks.push({ kind: heading ? "heading" : "prose", start, end, text: body, ...(heading ? { level: 2 } : {}) });
    }
    if (!found) return blocks;
    start = found.index + found[0].length;
  }
}

/** Blocks in the order of the text. Linear in its length; any text is fine. */
export function readBlocks(text: string, format: "markdown" | "plain"): readonly Block[] {
  return format === "markdown" ? markdownBlocks(text) : plainBlocks(text);
}
