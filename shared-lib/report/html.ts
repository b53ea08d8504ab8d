/** The report as one printable page: no script, nothing from a network, figures as inline SVG; every text is escaped. */

import { amountText, percentWithBounds } from "../advice/figures.ts";
import { ledgerCells, ledgerHeadings, linesBelow } from "../advice/ledger/write.ts";
import { barOf, hatchings, patchOf } from "./bar.ts";
import { escapeHtml } from "./escape-html.ts";
import { chargeInWords, kindInWords, placesOf, stepName } from "./rows.ts";
import type { CarbonylReport, NoteOnFile, StepReport } from "./types.ts";
import type { ReportWriter } from "./writer.ts";

const STYLE = `body{font:15px/1.5 system-ui,sans-serif;max-width:64rem;margin:2rem auto;padding:0 1rem;color:#1b1b1b;background:#fff}
h1{font-size:1.6rem}h2{font-size:1.25rem;border-top:2px solid #24464d;padding-top:.6rem;margin-top:2rem;overflow-wrap:anywhere}h3{font-size:1.05rem}
table{border-collapse:collapse;width:100%;margin:.6rem 0}th,td{text-align:left;vertical-align:top;padding:.3rem .6rem;border-bottom:1px solid #c8c8c8}
caption{text-align:left;font-weight:600;padding:.4rem 0}ul{padding-left:1.2rem}.forms{list-style:none;padding:0;margin:.3rem 0}
.warning{font-weight:600}.method{font-size:.9em;color:#333}code{font-size:.9em}tr,li{break-inside:avoid}@media print{body{margin:0;max-width:none}}`;

const cell = (text: string): string => `<td>${escapeHtml(text)}</td>`;
const heading = (text: string): string => `<th scope="col">${escapeHtml(text)}</th>`;

function table(caption: string, headings: readonly string[], rows: readonly string[]): string {
  return `<table><caption>${escapeHtml(caption)}</caption><thead><tr>${headings.map(heading).join("")}</tr></thead><tbody>${rows.join("")}</tbody></table>`;
}

function formsCell(carbonyl: CarbonylReport): string {
  if (carbonyl.outside !== undefined) return cell(`not estimated: ${carbonyl.outside}`);
  const rows = carbonyl.forms
    .filter((form) => form.fraction.value >= 0.005)
    .map((form) => `<li>${patchOf(form.kind)} ${escapeHtml(`${percentWithBounds(form.fraction)} ${form.label}`)}</li>`);
  const free = carbonyl.freeAmount ? `<li>free: ${escapeHtml(amountText(carbonyl.freeAmount.value))}</li>` : "";
  return `<td>${barOf(carbonyl.forms)}<ul class="forms">${rows.join("")}${free}</ul></td>`;
}

function methodOf(note: NoteOnFile, carbonyl: CarbonylReport): string {
  const name = note.report.mentions[carbonyl.mention]?.name ?? "";
  const lines = carbonyl.derivation.map(
    ({ says, value, source }) => `${says}${value ? `: ${value}` : ""}${source ? ` [${source}]` : ""}`,
  );
  const items = [...lines, ...carbonyl.cautions.map((caution) => `Caution: ${caution}`)];
  return `<div class="method"><strong>${escapeHtml(name)}</strong><ol>${items.map((line) => `<li>${escapeHtml(line)}</li>`).join("")}</ol></div>`;
}

function stepAsHtml(note: NoteOnFile, step: StepReport, lineOf: (offset: number) => number): string {
  if (step.carbonyls.length === 0) return "";
  const rows = step.carbonyls.map((carbonyl) => {
    const mention = note.report.mentions[carbonyl.mention];
    const form = note.report.charges[carbonyl.charge]?.suppliedForm ?? "as named";
    return `<tr>${cell(String(lineOf(mention?.start ?? 0)))}${cell(mention?.text ?? "")}${cell(chargeInWords(note, carbonyl))}${cell(form)}${formsCell(carbonyl)}</tr>`;
  });
  const forms = table(
    "Charges and their forms (central 95 %)",
    ["line", "reagent", "charged", "supplied form", "in the flask"],
    rows,
  );
  const { ledger } = step;
  const ledgerRows = ledger.rows.map((row) => `<tr>${ledgerCells(row).map(cell).join("")}</tr>`);
  const below = linesBelow(ledger).map((line) => `<p>${escapeHtml(line)}</p>`);
  const kind = kindInWords(step);
  return [
    `<h3>${escapeHtml(stepName(step))}</h3><p>${escapeHtml(`${kind.charAt(0).toUpperCase()}${kind.slice(1)}.`)}</p>`,
    forms,
    ledger.rows.length > 0 ? table("Ledger", ledgerHeadings, ledgerRows) + below.join("") : "",
    `<h4>How the figures were reached</h4>${step.carbonyls.map((carbonyl) => methodOf(note, carbonyl)).join("")}`,
  ].join("\n");
}

/** A section of one note. */
export function fileAsHtml(note: NoteOnFile): string {
  const { report, text } = note;
  const placeOf = placesOf(text);
  const lineOf = (offset: number): number => placeOf(offset).line;
  const findings = report.findings.map((finding) => {
    const titles = finding.fixes.map((fix) => fix.title).join("; ");
    return `<li><span class="${finding.severity}">line ${lineOf(finding.start)}, ${finding.severity}:</span> ${escapeHtml(finding.message)}${titles === "" ? "" : ` Correction: ${escapeHtml(titles)}.`} <code>${escapeHtml(finding.code)}</code></li>`;
  });
  const steps = (report.steps ?? []).map((step) => stepAsHtml(note, step, lineOf)).join("\n");
  const changes =
    findings.length > 0
      ? `<h3>What to change or to know</h3><ul>${findings.join("\n")}</ul>`
      : "<p>Nothing to change.</p>";
  return `<section><h2>${escapeHtml(report.path)}</h2>${steps}${changes}</section>`;
}

export const HTML_WRITER: ReportWriter = {
  withSteps: true,
  begin: () => `<!doctype html>
<html lang="en"><head><meta charset="utf-8"><meta name="viewport" content="width=device-width"><meta http-equiv="Content-Security-Policy" content="default-src 'none'; style-src 'unsafe-inline'"><title>Carbonyl forms in the flask</title><style>${STYLE}</style></head>
<body>${hatchings()}<main><h1>Carbonyl forms in the flask</h1>
`,
  note: fileAsHtml,
  between: "\n",
  end: (summary, { program, tables }) =>
    `</main><footer><p>Notes ${summary.files ?? 0}, carbonyl charges ${summary.carbonylCharges ?? 0}, findings ${summary.findings ?? 0}.</p><p>Oxomargin ${escapeHtml(program)}, tables ${escapeHtml(tables)}. Estimates with central 95 % bounds; they do not replace analysis, the safety data sheet, local rules and trained staff.</p></footer></body></html>\n`,
};
