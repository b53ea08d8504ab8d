/** What the margin says: findings (would change something) and hints (short figures beside the text). */

import type { Lexicon } from "../compounds/lexicon.ts";
import type { CarbonylForms } from "../equilibrium/types.ts";
import type { EquivalentOfStep } from "../flask/equivalent-of-step.ts";
import type { FlaskTimeline, ResolvedCharge, SpeciatedMoment } from "../flask/types.ts";
import type { Fix, Severity } from "../model/contract.ts";
import type { Settings } from "../model/settings.ts";
import type { Span } from "../model/span.ts";
import type { Charge, Mention, NoteEvent, NoteReading } from "../notes/types.ts";
import type { StepKind } from "./step-kinds/types.ts";

export interface SafeFix extends Fix {
  /** Right without judgement: what `oxomargin fix` applies. */
  readonly safe: boolean;
}

export interface Finding extends Span {
  readonly code: string;
  readonly severity: Severity;
  readonly message: string;
  /** Mention it speaks of. */
  readonly mention?: number;
  readonly fixes: readonly SafeFix[];
}

/** A short label placed at an offset; the card of its mention holds the depth. */
export interface Hint {
  readonly offset: number;
  /** At most 24 characters. */
  readonly label: string;
  readonly mention: number;
  /** Index into the moments it speaks of. */
  readonly moment: number;
}

export interface AdviceInput {
  readonly text: string;
  readonly reading: NoteReading;
  readonly timeline: FlaskTimeline;
  readonly moments: readonly SpeciatedMoment[];
  readonly settings: Settings;
  /** For the other supplied forms of a compound; without it no form is proposed. */
  readonly lexicon?: Lexicon;
}

export interface StepKindDecision {
  /** Undefined: unknown, and both readings are shown. */
  readonly kind?: StepKind;
  readonly by: "directive" | "partners" | "title" | "nothing";
}

/** One step of the note, with everything that was charged and what the program takes it for. */
export interface StepView {
  readonly number: number;
  readonly title?: string;
  readonly charges: readonly ResolvedCharge[];
  readonly events: readonly NoteEvent[];
  readonly moments: readonly SpeciatedMoment[];
  /** The fullest state of the main flask before its solvent is taken off or the step ends. */
  readonly decisive?: SpeciatedMoment;
  readonly equivalent?: EquivalentOfStep;
  readonly decision: StepKindDecision;
}

/** A carbonyl charge with the forms that it takes in the decisive state of its step. */
export interface CarbonylView {
  readonly charge: ResolvedCharge;
  readonly written: Charge;
  readonly mention: Mention;
  readonly step: StepView;
  readonly moment: SpeciatedMoment;
  /** Index of the moment. */
  readonly momentIndex: number;
  readonly forms: CarbonylForms;
}

/** Everything a finding may look at. */
export interface AdviceContext extends AdviceInput {
  readonly steps: readonly StepView[];
  readonly carbonyls: readonly CarbonylView[];
}

/** What a rule reports; the severity is the rule's own unless the finding has another. */
export type RawFinding = Omit<Finding, "code" | "severity"> & { readonly severity?: Severity; readonly code?: string };

/** One finding: one file, one object, one line in the list. */
export interface FindingRule {
  readonly code: string;
  readonly severity: Severity;
  /** One line for the table in the README. */
  readonly title: string;
  /** Markdown page: what it looks for, when it keeps silent, why, sources. */
  readonly page: string;
  look(context: AdviceContext): readonly RawFinding[];
}
