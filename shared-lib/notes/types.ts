/** What was written in a note: mentions, quantities, media and events, each with its place. Nothing here is computed chemistry. */

import type { Compound, SuppliedForm } from "../compounds/types.ts";
import type { AmountOf, MediumKind, Role } from "../model/contract.ts";
import type { Span } from "../model/span.ts";

export type QuantityKind = AmountOf | "density" | "temperature" | "time" | "pH" | "ratio";

export interface Quantity extends Span {
  /** As written, number and unit. */
  readonly text: string;
  readonly of: QuantityKind;
  /** The number as written (middle of a range) and its unit in plain spelling ("g", "mmol", "equiv", "wt%", "M"). */
  readonly value: number;
  readonly unit: string;
  /** In base units: g, L, mol, 1 (equiv), mol/L, mass or volume fraction (0–1), g/mL, K, s. */
  readonly base: number;
  /** Ends of a range, in base units. */
  readonly range?: { readonly low: number; readonly high: number };
  readonly approximate: boolean;
  /** Span of the number alone, so that a correction can replace just that. */
  readonly number: Span;
}

export interface Mention extends Span {
  readonly text: string;
  readonly name: string;
  readonly smiles?: string;
  /** Absent for a name that is recognised as a compound word but has no structure. */
  readonly compound?: Compound;
  /** The supplied form that the words around it say (formalin, "37 wt% aq.", "monohydrate"). */
  readonly form?: SuppliedForm;
  readonly role: Role;
  /** Has an aldehyde or ketone C=O, or is a supplied form of one. */
  readonly carbonyl: boolean;
}

/** A mention with what is put into the flask. */
export interface Charge {
  readonly mention: number;
  readonly amounts: readonly Quantity[];
  /** Whole extent in the text, mention and amounts. */
  readonly span: Span;
  readonly step: number;
  /** Solvent that a solution of it brings, when the words say so ("37 wt% aq.", "2 M in THF"). */
  readonly dissolvedIn?: readonly MediumPart[];
  /** Dimensionless share of a stock or of an earlier charge ("in 3 portions": 1; "half of": 0.5). */
  readonly share?: number;
}

export interface MediumPart {
  /** Key of the solvents or buffers table; absent for an unknown solvent word. */
  readonly solvent?: string;
  readonly words: string;
  /** Litres, when a volume is written. */
  readonly volumeL?: number;
  /** Grams, when a mass is written. */
  readonly massG?: number;
  /** Part of the mixture otherwise. */
  readonly part?: number;
  readonly basis: "volume" | "mass" | "mole";
  /** mol/L of a buffer or of a dissolved acid, base or salt. */
  readonly molarity?: number;
}

/** A solvent phrase ("9:1 MeOH/H2O (20 mL)"). */
export interface MediumPhrase extends Span {
  readonly parts: readonly MediumPart[];
  readonly step: number;
  readonly kind: MediumKind;
  /** Total litres written for the mixture. */
  readonly volumeL?: number;
  readonly pH?: number;
  readonly temperatureK?: number;
}

interface EventBase extends Span {
  readonly step: number;
  /** Which vessel of the step, 0 for the main flask. */
  readonly vessel: number;
}

export type NoteEvent = EventBase &
  (
    | { readonly kind: "charge"; readonly charge: number }
    | { readonly kind: "medium"; readonly medium: number }
    | { readonly kind: "temperature"; readonly kelvin: number; readonly reflux: boolean }
    | { readonly kind: "pH"; readonly pH: number }
    | { readonly kind: "hold"; readonly seconds: number }
    | { readonly kind: "remove"; readonly what: "solvent" | "water" }
    | { readonly kind: "transfer"; readonly from: number }
    | { readonly kind: "verb"; readonly verb: string }
    | { readonly kind: "quench" }
    | { readonly kind: "work-up" }
  );

/** One reaction stage: from its first charge to its work-up, its quench or the next heading. Steps count from 1 through the file. */
export interface Step extends Span {
  readonly number: number;
  readonly title?: string;
}

export interface Directive extends Span {
  readonly word: string;
  readonly argument: string;
  /** Text it governs. */
  readonly scope: Span;
}

/** Something written that cannot be right or cannot be read; advice turns it into a message at the place. */
export interface ReadingProblem extends Span {
  readonly code: string;
  readonly message: string;
}

export interface NoteReading {
  readonly mentions: readonly Mention[];
  readonly charges: readonly Charge[];
  readonly media: readonly MediumPhrase[];
  /** In the order in which they happen. */
  readonly events: readonly NoteEvent[];
  readonly steps: readonly Step[];
  readonly directives: readonly Directive[];
  readonly problems: readonly ReadingProblem[];
  /** True when a name or structure waits for the structure toolkit: read again with it. */
  readonly needsStructures: boolean;
}
