/** A ledger as a plain Markdown table and as CSV. */

import type { Interval } from "../../model/contract.ts";
import { amountText, massText, trimmed, volumeText } from "../figures.ts";
import type { LedgerRow, StepLedger } from "./types.ts";

/** Column headings of a ledger. */
export const ledgerHeadings = ["Charge", "Weighed as", "Mass", "Volume", "Amount", "Equiv", "Free equiv", "Brings"];

/** The table and the lines below it, without a final line break. */
export function ledgerMarkdown(ledger: StepLedger): string {
  const rows = ledger.rows.map((row) => `| ${ledgerCells(row).map(escaped).join(" | ")} |`);
  const table = [`| ${ledgerHeadings.join(" | ")} |`, `| ${ledgerHeadings.map(() => "---").join(" | ")} |`, ...rows];
  return [...table, "", ...linesBelow(ledger)].join("\n");
}

/** One row as plain text, a cell for each heading. */
export function ledgerCells(row: LedgerRow): readonly string[] {
  const assay = row.assay === undefined || row.assay === 1 ? "" : `${trimmed(row.assay * 100, 3)} wt%`;
  const form = [
    row.form ?? "",
    assay && !row.form?.includes("wt%") ? assay : "",
    row.form && row.formIs === "assumed" ? "assumed" : "",
  ];
  const brings = [
    row.water > 0 ? `${amountText(row.water)} water` : "",
    row.alcohol > 0 ? `${amountText(row.alcohol)} alcohol` : "",
  ];
  return [
    row.limiting ? `${row.name} (limiting)` : row.name,
    form.filter(Boolean).join(", "),
    row.massG === undefined ? "" : massText(row.massG),
    row.volumeL === undefined ? "" : volumeText(row.volumeL),
    row.amount ? amountText(row.amount.value) : "",
    row.equivalents === undefined ? "" : trimmed(row.equivalents, 3),
    row.freeEquivalents ? bounded(row.freeEquivalents) : "",
    brings.filter(Boolean).join(", "),
  ];
}

function bounded({ value, low, high }: Interval): string {
  const [mid, least, most] = [value, low, high].map((figure) =>
    figure < 1e-4 ? "0" : trimmed(figure, figure < 0.1 ? 1 : 2),
  );
  return least === most ? `${mid}` : `${mid} (${least} to ${most})`;
}

/** What a ledger says below its table, plain text. */
export function linesBelow(ledger: StepLedger): readonly string[] {
  const lines: string[] = [];
  if (ledger.equivalentMol !== undefined) {
    const by = ledger.countedBy === "written" ? "as written" : "the smallest charge";
    lines.push(
      `One equivalent is ${amountText(ledger.equivalentMol)} (${by}). Kind of step: ${ledger.kind ?? "not known"}.`,
    );
  }
  const { asSolvent, asHydrate, inSolutions, inSolventGrade } = ledger.water;
  const sources: readonly (readonly [number, string])[] = [
    [asSolvent, "as solvent"],
    [asHydrate, "bound in hydrates"],
    [inSolutions, "in solutions"],
    [inSolventGrade, "in opened solvent bottles, usually"],
  ];
  const told = sources.filter(([mol]) => mol > 0).map(([mol, where]) => `${amountText(mol)} ${where}`);
  if (told.length > 0) lines.push(`Water: ${told.join(", ")}.`);
  for (const { partner, equivalents } of ledger.waterAgainst) {
    if (equivalents > 0) lines.push(`That is ${trimmed(equivalents, 2)} equiv of ${partner}, which water destroys.`);
  }
  return lines;
}

function escaped(cell: string): string {
  return cell.replaceAll("\\", "\\\\").replaceAll("|", "\\|").replaceAll("\n", " ");
}

const CSV_COLUMNS = [
  "step,charge,weighed_as,form_is,assay,density_g_per_mL,mass_g,volume_L,amount_mol,amount_low_mol,amount_high_mol,equivalents",
  "free_equivalents,free_equivalents_low,free_equivalents_high,limiting,water_mol,alcohol_mol",
].join(",");

/** One row a charge, comma-separated after RFC 4180, figures in base units. */
export function ledgerCsv(ledgers: readonly StepLedger[]): string {
  const rows = ledgers.flatMap((ledger) => ledger.rows.map((row) => csvRow(ledger.step, row)));
  return `${[CSV_COLUMNS, ...rows].join("\r\n")}\r\n`;
}

function csvRow(step: number, row: LedgerRow): string {
  const { amount, freeEquivalents: free } = row;
  const figures = [
    row.assay,
    row.density,
    row.massG,
    row.volumeL,
    amount?.value,
    amount?.low,
    amount?.high,
    row.equivalents,
  ];
  const frees = [free?.value, free?.low, free?.high];
  const numbers = (values: readonly (number | undefined)[]) =>
    values.map((value) => (value === undefined ? "" : String(Number(value.toPrecision(6)))));
  const words = [String(step), quoted(row.name), quoted(row.form ?? ""), row.form ? row.formIs : ""];
  return [
    ...words,
    ...numbers(figures),
    ...numbers(frees),
    row.limiting ? "yes" : "no",
    ...numbers([row.water, row.alcohol]),
  ].join(",");
}

/** Quoted; a leading sign that a spreadsheet would take for a formula is held off by an apostrophe. */
function quoted(words: string): string {
  const safe = /^[=+\-@\t\r]/.test(words) ? `'${words}` : words;
  return `"${safe.replaceAll('"', '""')}"`;
}
