/** A markdown-it plugin: puts each label behind the words it speaks of. */

import type { MarkdownIt } from "markdown-it";
import type { MarginLabel } from "../../../server/protocol.ts";

/** @param labelsOf labels of a whole text; may be empty at first */
export function labelPlugin(md: MarkdownIt, labelsOf: (text: string) => readonly MarginLabel[]): void {
  md.core.ruler.push("oxomargin-labels", (state) => {
    if (state.inlineMode) return;
    const left = [...labelsOf(state.src)];
    for (const block of state.tokens) {
      if (block.type !== "inline" || !block.map || !block.children) continue;
      const [first, end] = block.map;
      const here = left.filter((label) => label.line >= first && label.line < end);
      for (const label of here) {
        const chip = new state.Token("html_inline", "", 0);
        chip.content = chipHtml(md, label);
        place(block.children, chip, label.words, state.Token);
        left.splice(left.indexOf(label), 1);
      }
    }
  });
}

type Children = NonNullable<ReturnType<MarkdownIt["parse"]>[number]["children"]>;
type TokenClass = new (type: string, tag: string, nesting: -1 | 0 | 1) => Children[number];

function chipHtml(md: MarkdownIt, label: MarginLabel): string {
  const { escapeHtml } = md.utils;
  return ` <small class="oxomargin-label" title="${escapeHtml(label.tip)}">[${escapeHtml(label.label)}]</small>`;
}

/** Behind the first text that holds the words, else at the end of the block. */
function place(children: Children, chip: Children[number], words: string, Token: TokenClass): void {
  const index = children.findIndex((child) => child.type === "text" && child.content.includes(words));
  const holder = children[index];
  if (!holder) return void children.push(chip);
  const cut = holder.content.indexOf(words) + words.length;
  const before = new Token("text", "", 0);
  before.content = holder.content.slice(0, cut);
  const after = new Token("text", "", 0);
  after.content = holder.content.slice(cut);
  children.splice(index, 1, before, chip, after);
}
