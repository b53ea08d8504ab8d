/** The ledger's Markdown table as cells, so that HTML shows the same figures. */

import type { StepLedger } from "../advice/ledger/types.ts";
import { ledgerMarkdown } from "../advice/ledger/write.ts";

export interface LedgerTable {
  readonly headings: readonly string[];
  readonly rows: readonly (readonly string[])[];
  /** Sentences below the table. */
  readonly below: readonly string[];
}

/** Cells of `| a | b |`; a backslash keeps the character after it. */
function cellsOf(line: string): readonly string[] {
  const cells: string[] = [];
  let cell = "";
  for (let i = 1; i < line.length; i++) {
    const c = line[i] as string;
    if (c === "\\") cell += line[++i] ?? "";
    else if (c === "|") {
      cells.push(cell.trim());
      cell = "";
    } else cell += c;
  }
  return cells;
}

/** Cells of a step's ledger. */
export function ledgerTable(ledger: StepLedger): LedgerTable {
  const lines = ledgerMarkdown(ledger).split("\n");
  const [headings = [], , ...rows] = lines.filter((line) => line.startsWith("|")).map(cellsOf);
  return { headings, rows, below: lines.filter((line) => line !== "" && !line.startsWith("|")) };
}
