/** The ledger of a step: every charge, what it is in the flask, and the water and alcohol that come in. Plain data. */

import type { Interval } from "../../model/contract.ts";

export interface LedgerRow {
  readonly name: string;
  /** Form that is weighed, when it is not the compound itself; "assumed" when the note does not say it. */
  readonly form?: string;
  readonly formIs: "written" | "assumed";
  /** Mass fraction. */
  readonly assay?: number;
  /** g/mL */
  readonly density?: number;
  readonly massG?: number;
  readonly volumeL?: number;
  /** mol */
  readonly amount?: Interval;
  /** On the writer's basis. */
  readonly equivalents?: number;
  /** Equivalents of free carbonyl, with bounds; carbonyl charges only. */
  readonly freeEquivalents?: Interval;
  readonly limiting: boolean;
  /** mol of water and alcohol that come in with it. */
  readonly water: number;
  readonly alcohol: number;
}

/** Water of a step by where it comes from, mol. */
export interface WaterOfStep {
  readonly asSolvent: number;
  readonly asHydrate: number;
  readonly inSolutions: number;
  /** Usual water of an opened bottle, for solvents that the note does not call dry. */
  readonly inSolventGrade: number;
}

export interface StepLedger {
  readonly step: number;
  readonly title?: string;
  /** Title of the kind of step; undefined when it is not known. */
  readonly kind?: string;
  /** mol of one equivalent, and whether the writer's equivalents say so. */
  readonly equivalentMol?: number;
  readonly countedBy?: "written" | "smallest";
  readonly rows: readonly LedgerRow[];
  readonly solvents: readonly { readonly name: string; readonly volumeL: number; readonly amount: number }[];
  readonly water: WaterOfStep;
  /** All water of the step, bottles left out, in equivalents of each partner that water destroys. */
  readonly waterAgainst: readonly { readonly partner: string; readonly equivalents: number }[];
}
