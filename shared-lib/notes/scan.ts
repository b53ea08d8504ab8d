/** One pass over a block: quantities, names of compounds, words that steer, brackets. Everything later works on this list. */

import type { Lexicon } from "../compounds/lexicon.ts";
import { isDigit, isLetter, isWordCharacter } from "../compounds/normal-form.ts";
import type { NameMatch, StructureToolkit } from "../compounds/types.ts";
import type { Span } from "../model/span.ts";
import { numberAt, quantityAt, ratioAt } from "./quantities.ts";
import type { Quantity, ReadingProblem } from "./types.ts";

export type Item = Span &
  (
    | { readonly kind: "quantity"; readonly quantity: Quantity }
    | { readonly kind: "name"; readonly match: NameMatch }
    | { readonly kind: "ratio"; readonly parts: readonly number[] }
    | { readonly kind: "pH"; readonly pH: number }
    | { readonly kind: "number" }
    | { readonly kind: "word"; readonly word: string }
    | { readonly kind: "mark"; readonly mark: string }
  );

export interface Scan {
  readonly items: readonly Item[];
  readonly problems: readonly ReadingProblem[];
  readonly needsStructures: boolean;
}

export interface ScanTools {
  readonly lexicon: Lexicon;
  readonly structures?: StructureToolkit | undefined;
}

const MARKS = new Set([..."()[]{},;:./|=+"]);
/** Behind these a name may begin without a space. */
const BEFORE_NAME = new Set([..." \t\n\r\u00a0([{/:;,|*_\"'“‘+=>"]);

function wordEnd(text: string, at: number): number {
  let i = at;
  while (i < text.length && (isLetter(text[i]) || isDigit(text[i]))) i++;
  return i;
}

/** To the end of a chunk that is one chemical word, so that "acid" inside "pent-4-enoic" starts no name of its own. */
function chunkEnd(text: string, at: number): number {
  let i = at;
  let depth = 0;
  while (i < text.length) {
    const c = text[i] as string;
    if (c === "(" || c === "[" || c === "{") depth++;
    else if (c === ")" || c === "]" || c === "}") {
      if (depth === 0) break;
      depth--;
    } else if (
      depth === 0 &&
      (c === " " || c === "\n" || c === "\t" || c === "/" || c === ";" || c === "\u00a0" || c === "|")
    )
      break;
    else if (depth > 0 && (c === " " || c === "\n")) break;
    else if (depth === 0 && c === "," && !isDigit(text[i + 1]) && !(text[i + 1] === "N" && text[i + 2] === "-")) break;
    i++;
  }
  // A bracket that opens behind a word and holds a space is a bracket of the sentence, not of the name.
  if (depth > 0) {
    const open = text.indexOf("(", at);
    if (open > at) return open;
  }
  return i;
}

function pHAt(text: string, at: number): { end: number; pH: number } | undefined {
  if (text[at] !== "p" || text[at + 1] !== "H" || isLetter(text[at + 2])) return undefined;
  let i = at + 2;
  const limit = Math.min(text.length, at + 40);
  while (i < limit && !isDigit(text[i]) && !/[.;(\n]/.test(text[i] as string)) i++;
  const number = isDigit(text[i]) ? numberAt(text, i) : undefined;
  if (!number || number.value > 16) return undefined;
  return { end: number.end, pH: number.value };
}

/** An inline structure: the word SMILES, then the structure up to the next space or closing bracket of the sentence. */
function smilesAt(text: string, at: number): { start: number; end: number; smiles: string } | undefined {
  if (!text.startsWith("SMILES", at)) return undefined;
  let start = at + 6;
  while (start < text.length && /[ :=`\u00a0]/.test(text[start] as string) && start - at < 12) start++;
  let depth = 0;
  let end = start;
  while (end < text.length && !/[\s`,;"]/.test(text[end] as string)) {
    if (text[end] === "(") depth++;
    if (text[end] === ")" && depth-- === 0) break;
    end++;
  }
  if (text[end - 1] === ".") end--;
  return end > start ? { start, end, smiles: text.slice(start, end) } : undefined;
}

function structureMatch(
  found: { start: number; end: number; smiles: string },
  tools: ScanTools,
): NameMatch | ReadingProblem | "needs structures" {
  const { structures } = tools;
  if (!structures) return "needs structures";
  const reading = structures.read(found.smiles);
  if (!reading.ok) {
    const at = found.start + Math.min(reading.at ?? 0, found.end - found.start - 1);
    return {
      start: reading.at === undefined ? found.start : at,
      end: reading.at === undefined ? found.end : at + 1,
      code: "reading/smiles",
      message: `This SMILES cannot be read: ${reading.problem}.`,
    };
  }
  return {
    start: found.start,
    end: found.end,
    by: "structure",
    compound: {
      id: reading.canonicalSmiles,
      name: found.smiles,
      smiles: reading.canonicalSmiles,
      formula: reading.formula,
      molarMass: reading.molarMass,
      tags: reading.carbonyl ? [reading.carbonyl.sites.some((site) => site.hydrogens > 0) ? "aldehyde" : "ketone"] : [],
      ...(reading.carbonyl ? { carbonyl: reading.carbonyl } : {}),
      origin: "structure",
    },
  };
}

/** Scans a block's text; offsets in the items are the block's own. */
export function scanBlock(text: string, tools: ScanTools): Scan {
  const items: Item[] = [];
  const problems: ReadingProblem[] = [];
  let needsStructures = false;
  let i = 0;
  /** Where the last name ended: behind it "-water" or "–THF" may begin another. */
  let lastName = -1;
  while (i < text.length) {
    const c = text[i] as string;
    if (c === " " || c === "\n") {
      i++;
      continue;
    }
    const before = text[i - 1];
    const fresh = before === undefined || BEFORE_NAME.has(before) || (i - 1 === lastName && !isWordCharacter(before));
    if (fresh && (isWordCharacter(c) || c === "(" || c === "[")) {
      const smiles = c === "S" ? smilesAt(text, i) : undefined;
      if (smiles) {
        const found = structureMatch(smiles, tools);
        if (found === "needs structures") needsStructures = true;
        else if ("code" in found) problems.push(found);
        else items.push({ kind: "name", start: found.start, end: found.end, match: found });
        i = smiles.end;
        continue;
      }
      const found = tools.lexicon.matchAt(text, i, tools.structures);
      if (found === "needs structures") needsStructures = true;
      else if (found) {
        items.push({ kind: "name", start: found.start, end: found.end, match: found });
        i = found.end;
        lastName = i;
        continue;
      }
    }
    if (isDigit(c) || (c === "." && isDigit(text[i + 1]) && !isDigit(before))) {
      const ratio = ratioAt(text, i);
      const quantity = quantityAt(text, i);
      if (quantity && (!ratio || quantity.end > ratio.end + 1)) {
        items.push({ kind: "quantity", start: quantity.start, end: quantity.end, quantity });
        i = quantity.end;
        continue;
      }
      if (ratio) {
        items.push({ kind: "ratio", ...ratio });
        i = ratio.end;
        continue;
      }
      const chunk = chunkEnd(text, i);
      const number = numberAt(text, i);
      const end = Math.max(
        number?.end ?? i + 1,
        isLetter(text[number?.end ?? i]) || text[number?.end ?? i] === "-" ? chunk : 0,
      );
      items.push({ kind: "number", start: i, end });
      i = end;
      continue;
    }
    const acidity = c === "p" ? pHAt(text, i) : undefined;
    if (acidity) {
      items.push({ kind: "pH", start: i, end: acidity.end, pH: acidity.pH });
      i = acidity.end;
      continue;
    }
    if (isLetter(c)) {
      const end = wordEnd(text, i);
      // A hyphen with a letter or digit behind it: one chemical word that the lexicon does not know. It is passed over whole.
      const whole =
        text[end] === "-" || text[end] === "‐" || text[end] === "‑" || text[end] === "'" ? chunkEnd(text, i) : end;
      items.push({ kind: "word", start: i, end: whole, word: text.slice(i, whole).toLowerCase() });
      i = Math.max(whole, i + 1);
      continue;
    }
    if (MARKS.has(c)) items.push({ kind: "mark", start: i, end: i + 1, mark: c });
    i++;
  }
  return { items, problems, needsStructures };
}
