/** The report as a terminal shows it: a note's carbonyl charges with their forms, then what to change. */

import type { FileReport } from "../model/contract.ts";
import { boundedPercent } from "./figures.ts";
import { lineStartsOf, placeOf } from "./line-table.ts";

/** Forms worth a line. */
const LEAST_SHARE = 0.005;

/** Last moment in which a mention is in the flask before its step ends: the fullest one. */
function decisiveForms(
  file: FileReport,
  mention: number,
): FileReport["flask"][number]["carbonyls"][number] | undefined {
  let found: FileReport["flask"][number]["carbonyls"][number] | undefined;
  for (const moment of file.flask) {
    const carbonyl = moment.carbonyls.find((candidate) => candidate.mention === mention);
    if (carbonyl) found = carbonyl;
  }
  return found;
}

/** Text of one note's report; `text` is the note itself, for line numbers. */
export function fileAsText(file: FileReport, text: string): string {
  const starts = lineStartsOf(text);
  const lines: string[] = [file.path];
  for (const charge of file.charges) {
    const mention = file.mentions[charge.mention];
    if (!mention?.carbonyl) continue;
    const { line } = placeOf(starts, mention.start);
    const amounts = charge.amounts.map((amount) => text.slice(amount.start, amount.end)).join(", ");
    lines.push(`  line ${line}  ${mention.text}${charge.suppliedForm ? ` [${charge.suppliedForm}]` : ""}: ${amounts}`);
    const forms = decisiveForms(file, charge.mention);
    if (!forms) continue;
    const listed = forms.forms.filter((form) => form.fraction.value >= LEAST_SHARE);
    lines.push(`          ${listed.map((form) => `${form.kind} ${boundedPercent(form.fraction)}`).join("; ")}`);
  }
  for (const finding of file.findings) {
    const { line, column } = placeOf(starts, finding.start);
    lines.push(`  ${line}:${column}  ${finding.severity}  ${finding.message}  [${finding.code}]`);
    for (const fix of finding.fixes) lines.push(`          can: ${fix.title}`);
  }
  if (lines.length === 1) lines.push("  nothing to say");
  return `${lines.join("\n")}\n`;
}
