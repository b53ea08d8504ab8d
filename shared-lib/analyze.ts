/** The whole way of the data in one place: text → notes → flask → equilibrium → advice. Pure, synchronous, never throws. */

import { advise } from "./advice/advise.ts";
import type { Finding, Hint } from "./advice/types.ts";
import type { Lexicon } from "./compounds/lexicon.ts";
import type { StructureToolkit } from "./compounds/types.ts";
import { rememberedSpeciation } from "./equilibrium/remembered.ts";
import { buildTimeline } from "./flask/timeline.ts";
import type { ResolvedCharge, SpeciatedMoment } from "./flask/types.ts";
import { DEFAULT_SETTINGS, type Settings } from "./model/settings.ts";
import { readNote } from "./notes/read-note.ts";
import type { NoteReading } from "./notes/types.ts";

export interface Analysis {
  readonly reading: NoteReading;
  readonly charges: readonly ResolvedCharge[];
  readonly moments: readonly SpeciatedMoment[];
  readonly findings: readonly Finding[];
  readonly hints: readonly Hint[];
}

export interface AnalyzeOptions {
  readonly format: "markdown" | "plain";
  readonly lexicon: Lexicon;
  readonly settings?: Settings;
  /** Given once loaded; without it `reading.needsStructures` says whether a second pass would learn more. */
  readonly structures?: StructureToolkit;
}

/**
 * Reads a note and works out what its flask holds, in which forms, and what to change.
 *
 * @param text the note; any text is fine
 * @returns plain data with UTF-16 offsets into `text`
 */
export function analyze(text: string, options: AnalyzeOptions): Analysis {
  const settings = options.settings ?? DEFAULT_SETTINGS;
  const reading = readNote(text, options);
  const timeline = buildTimeline(reading, settings, options.lexicon);
  const moments = timeline.moments.map((moment) => ({ ...moment, speciation: rememberedSpeciation(moment.contents) }));
  const advice = advise({ text, reading, timeline, moments, settings, lexicon: options.lexicon });
  return { reading, charges: timeline.charges, moments, findings: advice.findings, hints: advice.hints };
}
