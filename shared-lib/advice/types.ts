/** What the margin says: findings (would change something) and hints (short figures beside the text). */

import type { Lexicon } from "../compounds/lexicon.ts";
import type { FlaskTimeline, SpeciatedMoment } from "../flask/types.ts";
import type { Fix, Severity } from "../model/contract.ts";
import type { Settings } from "../model/settings.ts";
import type { Span } from "../model/span.ts";
import type { NoteReading } from "../notes/types.ts";

export interface Finding extends Span {
  readonly code: string;
  readonly severity: Severity;
  readonly message: string;
  /** Mention it speaks of. */
  readonly mention?: number;
  readonly fixes: readonly (Fix & {
    /** Right without judgement: what `oxomargin fix` applies. */
    readonly safe: boolean;
  })[];
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

/** Everything a finding may look at. */
export interface AdviceInput {
  readonly text: string;
  readonly reading: NoteReading;
  readonly timeline: FlaskTimeline;
  readonly moments: readonly SpeciatedMoment[];
  readonly settings: Settings;
  /** For the usual supplied form and for another one to switch to. */
  readonly lexicon?: Lexicon;
}

/** One finding: one file, one object, one line in the list. */
export interface FindingRule {
  readonly code: string;
  readonly severity: Severity;
  /** One line for the table in the README. */
  readonly title: string;
  /** Markdown page: what it looks for, when it keeps silent, why, sources. */
  readonly page: string;
  look(input: AdviceInput): readonly Finding[];
}
