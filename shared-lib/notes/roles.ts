/** Reagent, solvent, product or other; and where the work-up begins. */

import { solventByKey } from "../media/solvents.ts";
import type { Role } from "../model/contract.ts";
import type { Binding } from "./bind.ts";
import type { Block } from "./blocks.ts";
import type { Item } from "./scan.ts";
import { PRODUCT_WORDS, QUENCH_STEMS, SEPARATION_WORDS, startsWithAny, TITLE_WORDS, WORK_UP_STEMS } from "./words.ts";

type NameItem = Item & { kind: "name" };

/** Words after which a solvent is what things are in. */
const INTO = new Set([
  "in",
  "into",
  "dissolved",
  "suspended",
  "slurried",
  "diluted",
  "solution",
  "mixture",
  "suspension",
]);
/** Words that may stand between "in" and the solvent. */
const BETWEEN = new Set([
  "a",
  "an",
  "the",
  "dry",
  "anhydrous",
  "absolute",
  "abs",
  "aqueous",
  "aq",
  "mixture",
  "of",
  "degassed",
  "deionized",
  "deionised",
  "distilled",
  "and",
  "hot",
  "cold",
  "ice",
  "warm",
  "boiling",
  "commercial",
  "total",
  "additional",
  "more",
  "solution",
  "v",
  "glacial",
  "about",
]);

function isSentenceEnd(items: readonly Item[], i: number): boolean {
  const item = items[i];
  const next = items[i + 1];
  return item?.kind === "mark" && item.mark === "." && next !== undefined && next.start > item.end;
}

/** First item of the sentence that holds item `i`. */
function sentenceStart(items: readonly Item[], i: number): number {
  let start = i;
  while (start > 0 && !isSentenceEnd(items, start - 1)) start--;
  return start;
}

function wordAt(items: readonly Item[], i: number): string {
  const item = items[i];
  return item?.kind === "word" ? item.word : "";
}

/** Where a sentence speaks of work-up, its separation may already have begun with "poured" or "diluted". */
const OPENING_STEMS = ["pour", "dilut", "add", "neutral", "acidif", "basif", "concentrat", "cool", "allow"];

/** Item where the work-up begins, or the number of items. */
function findWorkUp(items: readonly Item[]): number {
  for (let i = 0; i < items.length; i++) {
    const word = wordAt(items, i);
    if (word === "") continue;
    const quench = startsWithAny(word, QUENCH_STEMS);
    const stem = startsWithAny(word, WORK_UP_STEMS);
    if (!stem && !quench) continue;
    // "distilled water", "freshly distilled benzaldehyde", "crystalline": a property, not a deed.
    const next = items[i + 1];
    if (word.startsWith("distill") && next?.kind === "name") continue;
    if (word === "crystalline" || word === "filtrate") {
      if (word === "crystalline") continue;
    }
    if (quench) return i;
    const start = sentenceStart(items, i);
    for (let k = start; k < i; k++) {
      const opening = startsWithAny(wordAt(items, k), OPENING_STEMS);
      const hasReagent = items
        .slice(k, i)
        .some(
          (item) => item.kind === "quantity" && (item.quantity.of === "amount" || item.quantity.of === "equivalents"),
        );
      if (opening && !hasReagent && start > 0) return k;
    }
    return i;
  }
  return items.length;
}

function hasMoles(binding: Binding | undefined): boolean {
  return binding?.amounts.some((amount) => amount.of === "amount" || amount.of === "equivalents") ?? false;
}

function isProduct(items: readonly Item[], name: number): boolean {
  for (let i = name - 1, steps = 0; i >= 0 && steps < 12; i--, steps++) {
    if (isSentenceEnd(items, i)) return false;
    const item = items[i] as Item;
    if (item.kind === "word" && PRODUCT_WORDS.has(item.word)) return true;
    if (item.kind === "name" && steps > 6) return false;
  }
  return false;
}

function isSeparation(items: readonly Item[], name: number): boolean {
  for (let i = name - 1, steps = 0; i >= 0 && steps < 6; i--, steps++) {
    if (isSentenceEnd(items, i)) break;
    if (SEPARATION_WORDS.has(wordAt(items, i))) return true;
  }
  const behind = wordAt(items, name + 1);
  return (
    behind === "bath" ||
    behind === "layer" ||
    behind === "phase" ||
    behind === "extracts" ||
    (items[name + 1]?.kind === "mark" && wordAt(items, name + 2) === "bath")
  );
}

/** "in MeOH", "into 20 mL of water", "in THF/water": the way back from the name leads to one of the words of INTO. */
function standsIn(items: readonly Item[], name: number): boolean {
  for (let i = name - 1, steps = 0; i >= 0 && steps < 10; i--, steps++) {
    const item = items[i] as Item;
    if (item.kind === "word") {
      if (INTO.has(item.word)) return true;
      if (!BETWEEN.has(item.word)) return false;
    } else if (item.kind === "mark") {
      if (!"/():,".includes(item.mark)) return false;
    } else if (item.kind === "name" && item.match.compound.solvent === undefined) return false;
  }
  return false;
}

function besideSolvent(items: readonly Item[], name: number): boolean {
  return (
    [name - 2, name + 2].some((other) => {
      const mark = items[(other + name) / 2];
      const neighbour = items[other];
      return (
        neighbour?.kind === "name" &&
        neighbour.match.compound.solvent !== undefined &&
        ((mark?.kind === "mark" && "/:".includes(mark.mark)) || (mark?.kind === "word" && mark.word === "and"))
      );
    }) ||
    [name - 1, name + 1].some(
      (other) => items[other]?.kind === "name" && (items[other] as NameItem).match.compound.solvent !== undefined,
    )
  );
}

function adds(item: NameItem): boolean {
  const { solvent } = item.match.compound;
  return solvent !== undefined && solventByKey(solvent)?.nucleophile !== "none";
}

function solventRole(items: readonly Item[], name: number, item: NameItem, binding: Binding | undefined): Role {
  const { compound } = item.match;
  if (compound.buffer) return "solvent";
  // Water and alcohols are medium whatever they are counted in; of the others, moles make a reagent.
  if (hasMoles(binding) && !adds(item)) return "reagent";
  if (standsIn(items, name) || besideSolvent(items, name)) return "solvent";
  const measured = binding?.amounts ?? [];
  const volume = measured.find((amount) => amount.of === "volume");
  if (compound.carbonyl)
    return measured.length === 0
      ? "other"
      : volume && volume.base >= 0.02 && !measured.some((amount) => amount.of === "mass")
        ? "solvent"
        : "reagent";
  const acidOrAmine = compound.tags.some((tag) => tag === "acid" || tag.endsWith("amine"));
  if (acidOrAmine && volume && volume.base < 0.005) return "reagent";
  return measured.length > 0 || wordAt(items, name - 1) !== "" ? "solvent" : "other";
}

function isTitle(items: readonly Item[], name: number): boolean {
  for (let i = 0; i < name; i++) {
    if (isSentenceEnd(items, i)) return false;
    if (i < 6 && TITLE_WORDS.has(wordAt(items, i)) && !items.slice(i, name).some((item) => item.kind === "quantity"))
      return true;
  }
  return false;
}

function roleOf(items: readonly Item[], name: number, binding: Binding | undefined): Role {
  const item = items[name] as NameItem;
  if (isSeparation(items, name)) return "other";
  if (item.match.compound.solvent !== undefined) return solventRole(items, name, item, binding);
  const measured = (binding?.amounts ?? []).some((amount) => amount.of !== "assay" && amount.of !== "concentration");
  if (isProduct(items, name) && !(measured && standsIn(items, name + 1))) return "product";
  if (!measured && isTitle(items, name)) return "product";
  return "reagent";
}

/** Roles of every name of a block, and the offset where the work-up begins. */
export function rolesOf(
  block: Block,
  items: readonly Item[],
  bindings: ReadonlyMap<number, Binding>,
): { readonly roles: ReadonlyMap<number, Role>; readonly workUp: number } {
  const roles = new Map<number, Role>();
  // A solvent named in a charge's bracket without a volume says what the charge is dissolved in: it is no medium of its own.
  const inside = new Set(
    [...bindings.values()].flatMap((binding) => (binding.amounts.length > 0 ? binding.inside : [])),
  );
  const workUpItem = block.kind === "table" || block.kind === "heading" ? items.length : findWorkUp(items);
  items.forEach((item, i) => {
    if (item.kind !== "name") return;
    if (block.kind === "heading") roles.set(i, item.match.compound.carbonyl ? "product" : "other");
    else if (i >= workUpItem) roles.set(i, isProduct(items, i) ? "product" : "other");
    else if (inside.has(i) && (bindings.get(i)?.amounts.length ?? 0) === 0) roles.set(i, "other");
    else roles.set(i, roleOf(items, i, bindings.get(i)));
  });
  return { roles, workUp: items[workUpItem]?.start ?? block.text.length };
}
