/** The contract's report of a file, with what a chemist files beside it: kinds of step, ledgers, and how the figures were reached. */

import type { StepLedger } from "../advice/ledger/types.ts";
import type { Consequence } from "../advice/step-kinds/types.ts";
import type { StepKindDecision } from "../advice/types.ts";
import type { DerivationLine, FileReport, FormShare, Interval } from "../model/contract.ts";

/** A carbonyl charge as its step meets it. */
export interface CarbonylReport {
  /** Index into mentions. */
  readonly mention: number;
  /** Index into charges. */
  readonly charge: number;
  readonly forms: readonly FormShare[];
  readonly free: Interval;
  /** mol free in the flask, when the amount follows from the note. */
  readonly freeAmount?: Interval;
  readonly halfLife?: Interval;
  readonly derivation: readonly DerivationLine[];
  readonly cautions: readonly string[];
  readonly outside?: string;
}

export interface StepReport {
  readonly number: number;
  readonly title?: string;
  /** Absent: the step was not recognised, and both readings hold. */
  readonly kind?: {
    readonly id: string;
    readonly title: string;
    readonly consequence: Consequence;
    readonly source: string;
  };
  readonly kindFrom: StepKindDecision["by"];
  readonly ledger: StepLedger;
  readonly carbonyls: readonly CarbonylReport[];
}

export interface NoteReport extends FileReport {
  readonly steps: readonly StepReport[];
}

/** A report with the text of its note, for lines and words. */
export interface NoteOnFile {
  readonly report: FileReport & { readonly steps?: readonly StepReport[] };
  readonly text: string;
}

/** What stands on every report: program and tables that made it. */
export interface Versions {
  readonly program: string;
  readonly tables: string;
}
