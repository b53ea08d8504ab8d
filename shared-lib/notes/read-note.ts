/** A whole note: blocks in order, steps, charges, media and events. Never throws; linear in the length of the text. */

import type { Lexicon } from "../compounds/lexicon.ts";
import type { StructureToolkit } from "../compounds/types.ts";
import { DEFAULT_SETTINGS, type Settings } from "../model/settings.ts";
import { moved } from "../model/span.ts";
import { type Block, readBlocks } from "./blocks.ts";
import { readConditions } from "./conditions.ts";
import { readDirectives } from "./directives.ts";
import { statedForm } from "./forms.ts";
import { mixtureOf } from "./media.ts";
import { withoutOwnWords } from "./own-words.ts";
import { type BlockReading, readBlock } from "./read-block.ts";
import { absurdities } from "./sanity.ts";
import type { Item } from "./scan.ts";
import type { Charge, MediumPhrase, Mention, NoteEvent, NoteReading, Quantity, ReadingProblem, Step } from "./types.ts";

export interface ReadOptions {
  readonly format: "markdown" | "plain";
  readonly lexicon: Lexicon;
  readonly structures?: StructureToolkit | undefined;
  readonly settings?: Settings | undefined;
}

/** Larger notes are read up to here, and that is said. */
const MOST_CHARACTERS = 20_000_000;

type NameItem = Item & { kind: "name" };

interface Draft {
  readonly mentions: Mention[];
  readonly charges: Charge[];
  readonly media: MediumPhrase[];
  readonly events: NoteEvent[];
  readonly steps: { number: number; start: number; end: number; title?: string }[];
  readonly problems: ReadingProblem[];
  needsStructures: boolean;
  title: string | undefined;
  /** The step at hand has been worked up: the next charge begins another. */
  workedUp: boolean;
  /** A heading stands before what comes now: it begins another step. */
  headed: boolean;
  solvents: string[];
}

function at(quantity: Quantity, by: number): Quantity {
  return { ...moved(quantity, by), number: moved(quantity.number, by) };
}

function openStep(draft: Draft, start: number): void {
  const number = draft.steps.length + 1;
  draft.steps.push({ number, start, end: start, ...(draft.title ? { title: draft.title } : {}) });
  draft.workedUp = false;
  draft.headed = false;
  draft.solvents = [];
}

/** Solvent that the words of a charge say it is dissolved in. */
function dissolvedIn(reading: BlockReading, name: number): string | undefined {
  const { items } = reading.scan;
  const binding = reading.bindings.get(name);
  for (const inside of binding?.inside ?? []) {
    const item = items[inside];
    if (item?.kind === "name" && item.match.compound.solvent) return item.match.compound.solvent;
  }
  const near = items.slice(Math.max(0, name - 4), Math.min(items.length, (binding?.last ?? name) + 1));
  if (near.some((item) => item.kind === "word" && ["aqueous", "aq", "water", "formalin"].includes(item.word)))
    return "water";
  const behind = items[name + 1];
  const inWord = behind?.kind === "word" && behind.word === "solution" ? items[name + 2] : behind;
  const solvent = items[name + (inWord === behind ? 2 : 3)];
  const strong = binding?.amounts.some((amount) => amount.of === "concentration" || amount.of === "assay");
  if (strong && inWord?.kind === "word" && inWord.word === "in" && solvent?.kind === "name")
    return solvent.match.compound.solvent;
  return undefined;
}

/** Supplied forms that are a compound of their own, with a structure to show. */
const DEFINED_FORMS = new Set(["hydrate", "hemiacetal", "acetal", "oligomer", "adduct", "salt"]);

function mentionOf(reading: BlockReading, name: number, block: Block, options: ReadOptions): Mention {
  const item = reading.scan.items[name] as NameItem;
  const { compound, form } = item.match;
  const stated = statedForm(
    compound,
    form,
    reading.bindings.get(name)?.amounts ?? [],
    dissolvedIn(reading, name),
    options.lexicon,
  );
  return {
    start: block.start + item.start,
    end: block.start + item.end,
    text: block.text.slice(item.start, item.end),
    name: compound.name,
    smiles: (stated.form && DEFINED_FORMS.has(stated.form.kind) ? stated.form.smiles : undefined) ?? compound.smiles,
    compound,
    ...(stated.form ? { form: stated.form } : {}),
    role: reading.roles.get(name) ?? "other",
    carbonyl: compound.carbonyl !== undefined,
  };
}

function isCharge(mention: Mention, amounts: readonly Quantity[]): boolean {
  return (
    mention.role === "reagent" &&
    amounts.some(
      (amount) =>
        amount.of === "mass" || amount.of === "volume" || amount.of === "amount" || amount.of === "equivalents",
    )
  );
}

function needsAqueous(mention: Mention, amounts: readonly Quantity[]): boolean {
  const dissolved = amounts.some(
    (amount) => amount.of === "concentration" || (amount.of === "assay" && amount.base < 0.85),
  );
  return (
    dissolved && (mention.compound?.tags.some((tag) => ["acid", "strong acid", "base", "salt"].includes(tag)) ?? false)
  );
}

function addCharge(
  draft: Draft,
  reading: BlockReading,
  name: number,
  mentionIndex: number,
  block: Block,
  step: number,
): void {
  const binding = reading.bindings.get(name);
  const mention = draft.mentions[mentionIndex] as Mention;
  const amounts = (binding?.amounts ?? []).map((quantity) => at(quantity, block.start));
  if (!isCharge(mention, amounts)) return;
  const solvent = dissolvedIn(reading, name) ?? (needsAqueous(mention, amounts) ? "water" : undefined);
  const start = Math.min(mention.start, ...amounts.map((amount) => amount.start));
  const end = Math.max(mention.end, ...amounts.map((amount) => amount.end));
  draft.problems.push(...absurdities(mention, amounts));
  draft.charges.push({
    mention: mentionIndex,
    amounts,
    span: { start, end },
    step,
    ...(solvent && !mention.form ? { dissolvedIn: [{ solvent, words: solvent, basis: "volume", part: 1 }] } : {}),
  });
  draft.events.push({ kind: "charge", charge: draft.charges.length - 1, start, end, step, vessel: 0 });
  addAqueous(draft, draft.charges.at(-1) as Charge, mention);
}

function addMedia(draft: Draft, reading: BlockReading, block: Block, step: number): void {
  for (const found of reading.media) {
    const { kind } = mixtureOf(found.parts);
    const start = block.start + found.start;
    const end = block.start + found.end;
    draft.media.push({
      start,
      end,
      step,
      kind,
      parts: found.parts,
      ...(found.volumeL === undefined ? {} : { volumeL: found.volumeL }),
      ...(found.pH === undefined ? {} : { pH: found.pH }),
    });
    draft.events.push({ kind: "medium", medium: draft.media.length - 1, start, end, step, vessel: 0 });
    draft.solvents.push(...found.parts.flatMap((part) => part.solvent ?? []));
  }
}

/** An aqueous acid, base or salt ("2 N HCl (5 mL)", "48 % HBr") brings its water into the medium. */
function addAqueous(draft: Draft, charge: Charge, mention: Mention): void {
  const volume = charge.amounts.find((amount) => amount.of === "volume");
  if (mention.carbonyl || !volume || charge.dissolvedIn?.[0]?.solvent !== "water") return;
  const parts: MediumPhrase["parts"] = [
    { solvent: "water", words: mention.text, basis: "volume", volumeL: volume.base },
  ];
  const { start, end } = mention;
  draft.media.push({ start, end, step: charge.step, kind: "aqueous", parts, volumeL: volume.base });
  draft.solvents.push("water");
}

function addConditions(draft: Draft, reading: BlockReading, block: Block, step: number, options: ReadOptions): void {
  const settings = options.settings ?? DEFAULT_SETTINGS;
  for (const condition of readConditions(reading.scan.items, settings.roomTemperatureC, draft.solvents)) {
    if (condition.start >= reading.workUp) break;
    const { start, end } = moved({ start: condition.start, end: condition.end }, block.start);
    draft.events.push({ ...condition, start, end, step, vessel: 0 });
  }
}

/** A list item or a paragraph that carries no chemistry belongs to no step. */
function concernsFlask(reading: BlockReading): boolean {
  return reading.scan.items.some((item) => item.kind === "name" || item.kind === "quantity" || item.kind === "pH");
}

function readOne(draft: Draft, block: Block, options: ReadOptions): void {
  const reading = readBlock(block, options.lexicon, options.structures);
  draft.needsStructures ||= reading.scan.needsStructures;
  draft.problems.push(...reading.scan.problems.map((problem) => moved(problem, block.start)));
  if (block.kind === "heading") {
    draft.title = block.text.replace(/^[#\s]+/, "").trim();
    draft.headed = true;
  } else if (
    concernsFlask(reading) &&
    (draft.steps.length === 0 || draft.headed || (draft.workedUp && reading.charges))
  )
    openStep(draft, block.start);
  const step = draft.steps.at(-1);
  const number = step?.number ?? 0;
  for (const [name] of reading.bindings) {
    draft.mentions.push(mentionOf(reading, name, block, options));
    if (block.kind !== "heading" && step) addCharge(draft, reading, name, draft.mentions.length - 1, block, number);
  }
  if (block.kind === "heading" || !step || draft.workedUp) return;
  step.end = block.end;
  addMedia(draft, reading, block, number);
  addConditions(draft, reading, block, number, options);
  if (reading.workUp < block.text.length) {
    draft.workedUp = true;
    const start = block.start + reading.workUp;
    draft.events.push({ kind: "work-up", start, end: start, step: number, vessel: 0 });
  }
}

/** Kind of the whole medium of each step: a phrase is a part of it. */
function stepKinds(media: readonly MediumPhrase[]): ReadonlyMap<number, MediumPhrase["kind"]> {
  const parts = new Map<number, MediumPhrase["parts"][number][]>();
  for (const medium of media) parts.set(medium.step, [...(parts.get(medium.step) ?? []), ...medium.parts]);
  return new Map([...parts].map(([step, own]) => [step, mixtureOf(own).kind]));
}

/**
 * Reads a note.
 *
 * @param text any text; offsets in the result are UTF-16 code units of it
 */
export function readNote(text: string, options: ReadOptions): NoteReading {
  const draft: Draft = {
    mentions: [],
    charges: [],
    media: [],
    events: [],
    steps: [],
    problems: [],
    needsStructures: false,
    title: undefined,
    workedUp: false,
    headed: false,
    solvents: [],
  };
  const readable = text.length > MOST_CHARACTERS ? text.slice(0, MOST_CHARACTERS) : text;
  if (readable.length < text.length)
    draft.problems.push({
      start: MOST_CHARACTERS,
      end: text.length,
      code: "reading/size",
      message: `Only the first ${MOST_CHARACTERS / 1e6} million characters are read.`,
    });
  for (const block of readBlocks(withoutOwnWords(readable), options.format)) readOne(draft, block, options);
  const { directives, problems } = readDirectives(readable);
  const kinds = stepKinds(draft.media);
  const order = (a: { start: number }, b: { start: number }): number => a.start - b.start;
  return {
    mentions: draft.mentions,
    charges: draft.charges,
    media: draft.media.map((medium) => ({ ...medium, kind: kinds.get(medium.step) ?? medium.kind })),
    events: [...draft.events].sort((a, b) => a.step - b.step || order(a, b)),
    steps: draft.steps as readonly Step[],
    directives,
    problems: [...draft.problems, ...problems].sort(order),
    needsStructures: draft.needsStructures,
  };
}
