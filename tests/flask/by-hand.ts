/** Readings made by hand, so that the flask is tested without the reader of notes. */

import type { MediumPhrase, NoteEvent, NoteReading, Quantity, QuantityKind } from "../../shared-lib/notes/types.ts";
import { lexicon } from "../advice/analyse.ts";

export function quantity(of: QuantityKind, base: number, extra: Partial<Quantity> = {}): Quantity {
  const span = { start: 0, end: 1 };
  return { ...span, text: `${base}`, of, value: base, unit: "", base, approximate: false, number: span, ...extra };
}

/** A charge by catalogue name, with its quantities in base units (g, L, mol, equiv, mol/L, fraction). */
export interface HandCharge {
  readonly name: string;
  readonly amounts: readonly Quantity[];
  readonly share?: number;
}

/** All charges go into step 1; the events stand in the order given, or are the charges one after the other. */
export function readingOf(
  charges: readonly HandCharge[],
  media: readonly MediumPhrase[] = [],
  events?: readonly Partial<NoteEvent>[],
): NoteReading {
  const span = { start: 0, end: 1 };
  const mentions = charges.map(({ name }) => {
    const match = lexicon.find(name);
    if (!match || match === "needs structures") throw new Error(`the catalogue lacks ${name}`);
    const { compound, form } = match;
    return { ...span, text: name, name, compound, ...(form ? { form } : {}), role: "reagent" as const, carbonyl: true };
  });
  const inOrder = charges.map((_, charge) => ({ kind: "charge", charge }) as const);
  return {
    mentions,
    charges: charges.map(({ amounts, share }, mention) => ({
      mention,
      amounts,
      span,
      step: 1,
      ...(share === undefined ? {} : { share }),
    })),
    media,
    events: (events ?? inOrder).map((event) => ({ ...span, step: 1, vessel: 0, ...event }) as NoteEvent),
    steps: [{ ...span, number: 1 }],
    directives: [],
    problems: [],
    needsStructures: false,
  };
}

export function medium(parts: MediumPhrase["parts"], extra: Partial<MediumPhrase> = {}): MediumPhrase {
  return { start: 0, end: 1, step: 1, kind: "mixed", parts, ...extra };
}
