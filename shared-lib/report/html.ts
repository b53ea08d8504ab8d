/** The report as one printable page: no script, nothing from a network, figures as inline SVG; every text is escaped. */

import type { FileReport } from "../model/contract.ts";
import { boundedPercent, percent } from "./figures.ts";
import { lineStartsOf, placeOf } from "./line-table.ts";

/** Text inside HTML, attributes included. */
export function escapeHtml(text: string): string {
  return text.replace(
    /[&<>"']/g,
    (c) => ({ "&": "&amp;", "<": "&lt;", ">": "&gt;", '"': "&quot;", "'": "&#39;" })[c] as string,
  );
}

const STYLE = `body{font:15px/1.5 system-ui,sans-serif;max-width:60rem;margin:2rem auto;padding:0 1rem;color:#1b1b1b;background:#fff}
table{border-collapse:collapse;width:100%}th,td{text-align:left;vertical-align:top;padding:.3rem .6rem;border-bottom:1px solid #c8c8c8}
caption{text-align:left;font-weight:600;padding:.4rem 0}code{font-size:.9em}section{break-inside:avoid-page}@media print{body{margin:0}}`;

const BAR = 220;

/** Shares as a bar; the pattern, not only the shade, tells the forms apart, and the table beside it says the same in words. */
function bar(forms: FileReport["flask"][number]["carbonyls"][number]["forms"]): string {
  let x = 0;
  const parts = forms.map((form, i) => {
    const width = form.fraction.value * BAR;
    const part = `<rect x="${x.toFixed(1)}" width="${width.toFixed(1)}" height="12" fill="${form.kind === "free carbonyl" ? "#fff" : `rgb(${90 + 30 * i},${110 + 25 * i},${120 + 20 * i})`}" stroke="#333" stroke-width="0.7"/>`;
    x += width;
    return part;
  });
  const label = forms.map((form) => `${form.kind} ${percent(form.fraction.value)} %`).join(", ");
  return `<svg role="img" aria-label="${escapeHtml(label)}" width="${BAR}" height="12">${parts.join("")}</svg>`;
}

function fileAsHtml(file: FileReport, text: string): string {
  const starts = lineStartsOf(text);
  const rows = file.charges.flatMap((charge) => {
    const mention = file.mentions[charge.mention];
    if (!mention?.carbonyl) return [];
    const last = file.flask
      .flatMap((moment) => moment.carbonyls.filter((carbonyl) => carbonyl.mention === charge.mention))
      .at(-1);
    const amounts = charge.amounts.map((amount) => text.slice(amount.start, amount.end)).join(", ");
    const forms = last
      ? `${bar(last.forms)}<br>${last.forms
          .filter((form) => form.fraction.value > 0.005)
          .map((form) => `${form.kind} ${boundedPercent(form.fraction)}`)
          .join("<br>")}`
      : "not assessed";
    return [
      `<tr><td>${placeOf(starts, mention.start).line}</td><td>${escapeHtml(mention.text)}</td><td>${escapeHtml(amounts)}</td><td>${escapeHtml(charge.suppliedForm ?? "as named")}</td><td>${forms}</td></tr>`,
    ];
  });
  const table =
    rows.length > 0
      ? `<table><caption>Charges and their forms (central 95 %)</caption><thead><tr><th scope="col">line</th><th scope="col">reagent</th><th scope="col">charged</th><th scope="col">supplied form</th><th scope="col">in the flask</th></tr></thead><tbody>${rows.join("")}</tbody></table>`
      : "";
  const findings = file.findings.map(
    (finding) =>
      `<li>line ${placeOf(starts, finding.start).line}, ${finding.severity}: ${escapeHtml(finding.message)} <code>${escapeHtml(finding.code)}</code></li>`,
  );
  return `<section><h2>${escapeHtml(file.path)}</h2>${table}${findings.length > 0 ? `<ul>${findings.join("")}</ul>` : "<p>Nothing to change.</p>"}</section>`;
}

/** The whole page. */
export function reportAsHtml(
  files: readonly { readonly report: FileReport; readonly text: string }[],
  version: string,
): string {
  return `<!doctype html>
<html lang="en"><head><meta charset="utf-8"><meta http-equiv="Content-Security-Policy" content="default-src 'none'; style-src 'unsafe-inline'"><title>Carbonyl forms in the flask</title><style>${STYLE}</style></head>
<body><h1>Carbonyl forms in the flask</h1>${files.map(({ report, text }) => fileAsHtml(report, text)).join("\n")}
<footer><p>Oxomargin ${escapeHtml(version)}. Estimates with central 95 % bounds; they replace neither analysis nor local rules and trained staff.</p></footer></body></html>
`;
}
