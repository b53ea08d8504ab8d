/** Which amounts belong to which name: in the bracket behind it, before it ("1.51 g of X"), or behind a comma. */

import type { Item } from "./scan.ts";
import type { Quantity } from "./types.ts";

/** What can be said of a charge. */
const AMOUNTS = new Set(["mass", "volume", "amount", "equivalents", "concentration", "assay", "density"]);

export interface Binding {
  /** Index of the name among the items. */
  readonly name: number;
  readonly amounts: readonly Quantity[];
  /** Extent of the name and its amounts, as item indices. */
  readonly first: number;
  readonly last: number;
  /** Names that stand inside the bracket: what it is dissolved in. */
  readonly inside: readonly number[];
}

function isAmount(item: Item | undefined): item is Item & { kind: "quantity" } {
  return item?.kind === "quantity" && AMOUNTS.has(item.quantity.of);
}

function isMark(item: Item | undefined, ...marks: string[]): boolean {
  return item?.kind === "mark" && marks.includes(item.mark);
}

/** Words that may stand between an amount and its name. */
const LINKS = new Set([
  "of",
  "a",
  "an",
  "the",
  "aqueous",
  "aq",
  "solution",
  "solid",
  "dry",
  "anhydrous",
  "absolute",
  "fresh",
  "freshly",
  "distilled",
  "commercial",
  "crude",
  "pure",
  "neat",
  "liquid",
  "gaseous",
  "powdered",
  "total",
  "or",
  "about",
  "approximately",
  "concentrated",
  "conc",
  "dilute",
  "w",
  "wt",
  "strength",
  "purity",
  "cold",
  "hot",
  "ice",
]);
/** Words that may stand between a name and its bracket. */
const TAILS = new Set([
  "solution",
  "aqueous",
  "aq",
  "itself",
  "dihydrate",
  "monohydrate",
  "hydrate",
  "hydrochloride",
  "compound",
  "reagent",
  "was",
  "powder",
  "solid",
  "buffer",
]);

/** Close of the bracket that opens at `open`, at most 60 items on; undefined when it is not closed there. */
function closeOf(items: readonly Item[], open: number): number | undefined {
  let depth = 0;
  for (let i = open; i < Math.min(items.length, open + 60); i++) {
    if (isMark(items[i], "(", "[")) depth++;
    if (isMark(items[i], ")", "]") && --depth === 0) return i;
  }
  return undefined;
}

function openOf(items: readonly Item[], close: number): number | undefined {
  let depth = 0;
  for (let i = close; i >= Math.max(0, close - 60); i--) {
    if (isMark(items[i], ")", "]")) depth++;
    if (isMark(items[i], "(", "[") && --depth === 0) return i;
  }
  return undefined;
}

interface Side {
  readonly amounts: readonly Quantity[];
  readonly edge: number;
  readonly inside: readonly number[];
}

/** A volume that stands right before or right behind another name of the bracket is that name's ("in 20 mL THF"). */
function isOfInner(items: readonly Item[], i: number, close: number): boolean {
  const item = items[i];
  if (!isAmount(item) || item.quantity.of !== "volume") return false;
  const next =
    items[i + 1]?.kind === "word" && (items[i + 1] as Item & { kind: "word" }).word === "of"
      ? items[i + 2]
      : items[i + 1];
  if (next?.kind === "name" && next.end <= (items[close] as Item).start) return true;
  return items[i - 1]?.kind === "name";
}

/** Amounts of a bracket without those of the names inside it. */
function inBracket(items: readonly Item[], open: number, close: number, taken: ReadonlySet<number>): Side {
  const amounts: Quantity[] = [];
  const inside: number[] = [];
  for (let i = open + 1; i < close; i++) {
    const item = items[i] as Item;
    if (item.kind === "name") inside.push(i);
    if (isAmount(item) && !taken.has(i) && !isOfInner(items, i, close)) amounts.push(item.quantity);
  }
  return { amounts, edge: close, inside };
}

function rightOf(items: readonly Item[], name: number, taken: ReadonlySet<number>): Side | undefined {
  let i = name + 1;
  for (let skipped = 0; skipped < 3; skipped++) {
    const item = items[i];
    if (
      item?.kind === "number" ||
      (item?.kind === "word" && TAILS.has(item.word)) ||
      (item?.kind === "word" && /^\d*[a-z]$/.test(item.word))
    )
      i++;
    else break;
  }
  // "X (racemic) (2 g, 10 mmol)": a bracket without amounts may stand first.
  for (let brackets = 0; brackets < 2 && isMark(items[i], "(", "["); brackets++) {
    const close = closeOf(items, i);
    if (close === undefined) return undefined;
    const side = inBracket(items, i, close, taken);
    if (side.amounts.length > 0) return side;
    i = close + 1;
  }
  // "X, 1.51 g, 10 mmol" and "X: 1.51 g" and, at the end of a line of a list, "X 1.51 g".
  const start = isMark(items[i], ",", ":", "=", "|") ? i + 1 : i;
  const amounts: Quantity[] = [];
  let edge = start;
  for (let k = start; k < items.length; k++) {
    const item = items[k];
    if (isAmount(item) && !taken.has(k)) {
      amounts.push(item.quantity);
      edge = k;
    } else if (isMark(item, ",", "(", ")", "/", "=", ";") && amounts.length > 0) continue;
    else break;
  }
  const next = items[edge + 1];
  const ownedByNext = next?.kind === "name" || (next?.kind === "word" && next.word === "of");
  return amounts.length > 0 && !ownedByNext ? { amounts, edge, inside: [] } : undefined;
}

function leftOf(items: readonly Item[], name: number, taken: ReadonlySet<number>): Side | undefined {
  const amounts: Quantity[] = [];
  let edge = name;
  let links = 0;
  for (let i = name - 1; i >= 0; i--) {
    const item = items[i] as Item;
    if (isAmount(item)) {
      if (taken.has(i)) break;
      amounts.unshift(item.quantity);
      edge = i;
      links = 0;
    } else if (item.kind === "word" && LINKS.has(item.word) && links < 4) links++;
    else if (isMark(item, ")", "]")) {
      const open = openOf(items, i);
      if (open === undefined || open + 1 === i) break;
      // "1.51 g (10 mmol) of X": a bracket of amounts only, with an amount before it. Without one it is the bracket of the name before it.
      if (!isAmount(items[open - 1])) break;
      const within = items.slice(open + 1, i);
      const pure = within.every(
        (inner) =>
          isAmount(inner) ||
          inner.kind === "mark" ||
          inner.kind === "number" ||
          (inner.kind === "word" && LINKS.has(inner.word)),
      );
      if (!pure || !within.some((inner) => isAmount(inner)) || within.some((_, k) => taken.has(open + 1 + k))) break;
      amounts.unshift(...within.flatMap((inner) => (isAmount(inner) ? [inner.quantity] : [])));
      edge = open;
      i = open;
      links = 0;
    } else if (isMark(item, ",", ".", "/", "|") && amounts.length > 0 && isAmount(items[i - 1])) continue;
    else if (
      isMark(item, ".") &&
      items[i - 1]?.kind === "word" &&
      LINKS.has((items[i - 1] as Item & { kind: "word" }).word)
    )
      continue;
    else break;
  }
  return amounts.length > 0 ? { amounts, edge, inside: [] } : undefined;
}

/** Index of every item that a side took, so that no amount is given twice. */
function take(items: readonly Item[], side: Side, taken: Set<number>): void {
  items.forEach((item, i) => {
    if (item.kind === "quantity" && side.amounts.includes(item.quantity)) taken.add(i);
  });
}

/** Names that stand right before a slash, a dash or "and" and another solvent: parts of one mixture share what follows. */
export function bindAmounts(items: readonly Item[]): readonly Binding[] {
  const taken = new Set<number>();
  const bindings: Binding[] = [];
  const insideOfOther = new Set<number>();
  items.forEach((item, i) => {
    if (item.kind !== "name") return;
    const left = leftOf(items, i, taken);
    // Only a strength right before the name ("37 % formaldehyde (8.1 mL)") leaves the bracket behind it to be read as well.
    const right =
      !left ||
      left.amounts.every((amount) => amount.of === "assay" || amount.of === "concentration") ||
      isMark(items[i + 1], "(")
        ? rightOf(items, i, taken)
        : undefined;
    if (left) take(items, left, taken);
    if (right) take(items, right, taken);
    for (const inside of right?.inside ?? []) insideOfOther.add(inside);
    bindings.push({
      name: i,
      amounts: [...(left?.amounts ?? []), ...(right?.amounts ?? [])],
      first: left?.edge ?? i,
      last: Math.max(i, right?.edge ?? i),
      inside: right?.inside ?? [],
    });
  });
  return bindings;
}
