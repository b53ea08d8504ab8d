/** The report as Markdown, to be filed with a batch record. Text of the note is escaped: it may hold anything. */

import type { FileReport } from "../model/contract.ts";
import { boundedPercent } from "./figures.ts";
import { lineStartsOf, placeOf } from "./line-table.ts";

/** Text of a note inside Markdown: no character of it formats anything. */
export function escapeMarkdown(text: string): string {
  return text
    .replace(/[\\`*_{}[\]()#+\-.!|<>&~]/g, (c) =>
      c === "<" ? "&lt;" : c === ">" ? "&gt;" : c === "&" ? "&amp;" : `\\${c}`,
    )
    .replace(/\s+/g, " ");
}

/** A section of one note. */
export function fileAsMarkdown(file: FileReport, text: string): string {
  const starts = lineStartsOf(text);
  const lines = [`## ${escapeMarkdown(file.path)}`, ""];
  const rows = file.charges.filter((charge) => file.mentions[charge.mention]?.carbonyl);
  if (rows.length > 0) {
    lines.push(
      "| line | reagent | charged | supplied form | forms in the flask (central 95 %) |",
      "| --- | --- | --- | --- | --- |",
    );
    for (const charge of rows) {
      const mention = file.mentions[charge.mention];
      if (!mention) continue;
      const last = file.flask
        .flatMap((moment) => moment.carbonyls.filter((carbonyl) => carbonyl.mention === charge.mention))
        .at(-1);
      const forms = last
        ? last.forms
            .filter((form) => form.fraction.value > 0.005)
            .map((form) => `${form.kind} ${boundedPercent(form.fraction)}`)
            .join("; ")
        : "not assessed";
      const amounts = charge.amounts.map((amount) => text.slice(amount.start, amount.end)).join(", ");
      lines.push(
        `| ${placeOf(starts, mention.start).line} | ${escapeMarkdown(mention.text)} | ${escapeMarkdown(amounts)} | ${escapeMarkdown(charge.suppliedForm ?? "as named")} | ${forms} |`,
      );
    }
    lines.push("");
  }
  for (const finding of file.findings)
    lines.push(
      `- line ${placeOf(starts, finding.start).line}, ${finding.severity}, \`${finding.code}\`: ${escapeMarkdown(finding.message)}`,
    );
  if (file.findings.length === 0) lines.push("Nothing to change.");
  return `${lines.join("\n")}\n`;
}

/** The whole report. */
export function reportAsMarkdown(
  files: readonly { readonly report: FileReport; readonly text: string }[],
  version: string,
): string {
  return `# Carbonyl forms in the flask\n\n${files.map(({ report, text }) => fileAsMarkdown(report, text)).join("\n")}\nOxomargin ${version}. Estimates with central 95 % bounds; they replace neither analysis nor local rules and trained staff.\n`;
}
