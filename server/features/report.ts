/** The report of a set of notes, in the same words as the terminal's. */

import { version } from "../../package.json";
import { tables } from "../../shared-lib/generated/tables-version.json";
import { WRITERS } from "../../shared-lib/report/formats.ts";
import { addSummary, summaryOf } from "../../shared-lib/report/summary.ts";
import type { NoteOnFile } from "../../shared-lib/report/types.ts";
import { writeWhole } from "../../shared-lib/report/writer.ts";

export function reportOf(notes: readonly NoteOnFile[], format: "html" | "markdown"): string {
  const summary: Record<string, number> = {};
  for (const { report } of notes) addSummary(summary, summaryOf(report));
  return writeWhole(WRITERS[format], notes, summary, { program: version, tables });
}
