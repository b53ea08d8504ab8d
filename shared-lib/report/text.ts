/** The report as a terminal shows it: what each step was taken for, its carbonyl charges with their forms, then what to change. */

import { chargeInWords, formsInWords, kindInWords, placesOf, stepName } from "./rows.ts";
import type { CarbonylReport, NoteOnFile } from "./types.ts";
import type { ReportWriter } from "./writer.ts";

/** Control characters of a note would steer the terminal: they are shown as a mark. */
function printable(text: string): string {
  let out = "";
  for (const c of text) {
    const code = c.codePointAt(0) as number;
    const control = (code < 0x20 && code !== 0x0a && code !== 0x09) || (code >= 0x7f && code < 0xa0);
    out += control || (code >= 0x202a && code <= 0x202e) || (code >= 0x2066 && code <= 0x2069) ? "\uFFFD" : c;
  }
  return out;
}

function carbonylLines(note: NoteOnFile, carbonyl: CarbonylReport, line: number): readonly string[] {
  const mention = note.report.mentions[carbonyl.mention];
  const form = note.report.charges[carbonyl.charge]?.suppliedForm;
  const amounts = chargeInWords(note, carbonyl);
  const what = `${mention?.text ?? ""}${form ? ` [${form}]` : ""}${amounts === "" ? "" : `: ${amounts}`}`;
  return [
    `    line ${line}  ${what.replace(/\s+/g, " ")}`,
    `      ${carbonyl.outside === undefined ? formsInWords(carbonyl.forms) : `not estimated: ${carbonyl.outside}`}`,
  ];
}

/** Text of one note's report. */
export function fileAsText(note: NoteOnFile): string {
  const { report, text } = note;
  const placeOf = placesOf(text);
  const lines: string[] = [report.path];
  for (const step of report.steps ?? []) {
    if (step.carbonyls.length === 0) continue;
    lines.push(`  ${stepName(step)}, ${kindInWords(step)}`);
    for (const carbonyl of step.carbonyls)
      lines.push(...carbonylLines(note, carbonyl, placeOf(report.mentions[carbonyl.mention]?.start ?? 0).line));
  }
  for (const finding of report.findings) {
    const { line, column } = placeOf(finding.start);
    lines.push(`  ${line}:${column}  ${finding.severity}  ${finding.message}  [${finding.code}]`);
    const titles = finding.fixes.map((fix) => fix.title).join("; ");
    if (titles !== "") lines.push(`      can: ${titles}`);
  }
  if (lines.length === 1) lines.push("  nothing to say");
  return `${printable(lines.join("\n"))}\n`;
}

export const TEXT_WRITER: ReportWriter = {
  withSteps: true,
  begin: () => "",
  note: fileAsText,
  between: "",
  end: ({ files = 0, carbonylCharges = 0, findings = 0 }) =>
    `${files} ${files === 1 ? "note" : "notes"}, ${carbonylCharges} carbonyl ${carbonylCharges === 1 ? "charge" : "charges"}, ${findings} ${findings === 1 ? "finding" : "findings"}\n`,
};
