/** The ledgers of all steps as CSV, for a spreadsheet: the note's path first, one row a charge, figures in base units. */

import { ledgerCsv } from "../advice/ledger/write.ts";
import type { ReportWriter } from "./writer.ts";

function quoted(words: string): string {
  const safe = /^[=+\-@\t\r]/.test(words) ? `'${words}` : words;
  return `"${safe.replaceAll('"', '""')}"`;
}

const [COLUMNS = ""] = ledgerCsv([]).split("\r\n");

export const CSV_WRITER: ReportWriter = {
  withSteps: true,
  begin: () => `note,${COLUMNS}\r\n`,
  note: ({ report }) => {
    // A step at a time, so that a line break inside a quoted name never splits a row.
    const ledgers = (report.steps ?? []).map((step) => step.ledger);
    const rows = ledgers.flatMap((ledger) => ledger.rows.map((row) => ledgerCsv([{ ...ledger, rows: [row] }])));
    return rows.map((csv) => `${quoted(report.path)},${csv.slice(COLUMNS.length + 2)}`).join("");
  },
  between: "",
  end: () => "",
};
