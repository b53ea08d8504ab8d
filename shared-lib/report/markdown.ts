/** The report as Markdown, to be filed with a batch record. Text of the note is escaped: it may hold anything. */

import { ledgerMarkdown } from "../advice/ledger/write.ts";
import { escapeMarkdown } from "./card/escape-markdown.ts";
import { chargeInWords, formsInWords, kindInWords, placesOf, stepName } from "./rows.ts";
import type { CarbonylReport, NoteOnFile, StepReport, Versions } from "./types.ts";
import type { ReportWriter } from "./writer.ts";

function formsTable(note: NoteOnFile, step: StepReport, lineOf: (offset: number) => number): readonly string[] {
  const rows = step.carbonyls.map((carbonyl) => {
    const mention = note.report.mentions[carbonyl.mention];
    const cells = [
      String(lineOf(mention?.start ?? 0)),
      mention?.text ?? "",
      chargeInWords(note, carbonyl),
      note.report.charges[carbonyl.charge]?.suppliedForm ?? "as named",
      carbonyl.outside === undefined ? formsInWords(carbonyl.forms) : `not estimated: ${carbonyl.outside}`,
    ];
    return `| ${cells.map(escapeMarkdown).join(" | ")} |`;
  });
  const head = ["line", "reagent", "charged", "supplied form", "forms in the flask (central 95 %)"];
  return [`| ${head.join(" | ")} |`, `| ${head.map(() => "---").join(" | ")} |`, ...rows, ""];
}

function methodOf(note: NoteOnFile, carbonyl: CarbonylReport): readonly string[] {
  const name = note.report.mentions[carbonyl.mention]?.name ?? "";
  const lines = carbonyl.derivation.map(
    ({ says, value, source }) =>
      `  - ${escapeMarkdown(says)}${value ? `: ${escapeMarkdown(value)}` : ""}${source ? ` (${escapeMarkdown(source)})` : ""}`,
  );
  const cautions = carbonyl.cautions.map((caution) => `  - Caution: ${escapeMarkdown(caution)}`);
  return [`- ${escapeMarkdown(name)}`, ...lines, ...cautions];
}

function stepAsMarkdown(note: NoteOnFile, step: StepReport, lineOf: (offset: number) => number): readonly string[] {
  if (step.carbonyls.length === 0) return [];
  const kind = kindInWords(step);
  return [
    `### ${escapeMarkdown(stepName(step))}`,
    "",
    `${kind.charAt(0).toUpperCase()}${kind.slice(1)}.`,
    "",
    ...formsTable(note, step, lineOf),
    ...(step.ledger.rows.length > 0 ? ["Ledger:", "", ledgerMarkdown(step.ledger), ""] : []),
    "How the figures were reached:",
    "",
    ...step.carbonyls.flatMap((carbonyl) => methodOf(note, carbonyl)),
    "",
  ];
}

/** A section of one note. */
export function fileAsMarkdown(note: NoteOnFile): string {
  const { report, text } = note;
  const placeOf = placesOf(text);
  const lineOf = (offset: number): number => placeOf(offset).line;
  const lines = [`## ${escapeMarkdown(report.path)}`, ""];
  for (const step of report.steps ?? []) lines.push(...stepAsMarkdown(note, step, lineOf));
  lines.push(report.findings.length > 0 ? "What to change or to know:" : "Nothing to change.");
  if (report.findings.length > 0) lines.push("");
  for (const finding of report.findings) {
    const titles = finding.fixes.map((fix) => fix.title).join("; ");
    lines.push(
      `- line ${lineOf(finding.start)}, ${finding.severity}, \`${finding.code}\`: ${escapeMarkdown(finding.message)}${titles === "" ? "" : ` Correction: ${escapeMarkdown(titles)}.`}`,
    );
  }
  return `${lines.join("\n")}\n`;
}

export const MARKDOWN_WRITER: ReportWriter = {
  withSteps: true,
  begin: () => "# Carbonyl forms in the flask\n\n",
  note: fileAsMarkdown,
  between: "\n",
  end: (summary, { program, tables }: Versions) =>
    `\nNotes ${summary.files ?? 0}, carbonyl charges ${summary.carbonylCharges ?? 0}, findings ${summary.findings ?? 0}.\n\nOxomargin ${program}, tables ${tables}. Estimates with central 95 % bounds; they do not replace analysis, the safety data sheet, local rules and trained staff.\n`,
};
