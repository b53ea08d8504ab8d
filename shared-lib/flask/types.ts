/** What is in the vessel after each event of a note. */

import type { Compound, SuppliedForm } from "../compounds/types.ts";
import type { Contents, Speciation } from "../equilibrium/types.ts";
import type { Interval } from "../model/contract.ts";

/** A charge in real amounts. Absent figures were not written and do not follow. */
export interface ResolvedCharge {
  /** Index into the reading's charges, and of its mention. */
  readonly charge: number;
  readonly mention: number;
  readonly step: number;
  readonly compound: Compound;
  /** The form in which it was weighed or measured out, and whether the note says so or it is the usual one. */
  readonly form?: SuppliedForm;
  readonly formIs: "written" | "assumed";
  /** mol of the compound, after assay, density and supplied form. */
  readonly total?: Interval;
  /** g and L of what is weighed out. */
  readonly massG?: number;
  readonly volumeL?: number;
  /** Equivalents as written, or from the amounts and the step's limiting reagent. */
  readonly equivalents?: number;
  /** Solvents it brings, mol, by key of the solvents table (bound water of a hydrate counts as water). */
  readonly brings: readonly { readonly solvent: string; readonly amount: number }[];
  /** How `total` was reached, in words, in order. */
  readonly how: readonly string[];
}

/** The vessel after one event. */
export interface FlaskMoment {
  /** Index into the reading's events. */
  readonly event: number;
  readonly step: number;
  /** Which vessel of the step, 0 for the main flask. */
  readonly vessel?: number;
  /** Offset of the event in the text. */
  readonly offset: number;
  readonly contents: Contents;
  /** Mention index of each row of contents.carbonyls. */
  readonly carbonylMentions: readonly number[];
  /** s that the note keeps it like this. */
  readonly heldSeconds?: number;
  readonly temperatureStated: boolean;
  readonly pHStated: boolean;
  /** False when the size of a mixture is not written and a usual one is taken. */
  readonly volumeStated?: boolean;
}

export interface SpeciatedMoment extends FlaskMoment {
  readonly speciation: Speciation;
}

export interface FlaskTimeline {
  readonly charges: readonly ResolvedCharge[];
  readonly moments: readonly FlaskMoment[];
}
