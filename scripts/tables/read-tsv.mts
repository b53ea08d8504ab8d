import { readFile } from "node:fs/promises";
import path from "node:path";
import { fileURLToPath } from "node:url";

const root = path.join(path.dirname(fileURLToPath(import.meta.url)), "..", "..");

/** A row of a table by column name, and where it stands, for a message that names the place. */
export interface TableRow {
  readonly cells: Readonly<Record<string, string>>;
  readonly place: string;
}

/**
 * Reads a TSV whose first line that is not a comment (#) names the columns.
 *
 * @param file path from the root of the project
 * @throws Error naming file and line for a row with another number of cells, or when a column is missing
 */
export async function readTsv(file: string, columns: readonly string[]): Promise<readonly TableRow[]> {
  const lines = (await readFile(path.join(root, file), "utf8")).split(/\r?\n/);
  let names: string[] | undefined;
  const rows: TableRow[] = [];
  lines.forEach((line, index) => {
    if (line.trim() === "" || line.startsWith("#")) return;
    const cells = line.split("\t").map((cell) => cell.trim());
    const place = `${file}:${index + 1}`;
    if (!names) {
      names = cells;
      const lacking = columns.filter((column) => !cells.includes(column));
      if (lacking.length > 0) throw new Error(`${place}: the heading lacks ${lacking.join(", ")}`);
      return;
    }
    if (cells.length > names.length) throw new Error(`${place}: ${cells.length} cells under ${names.length} columns`);
    rows.push({ cells: Object.fromEntries(names.map((name, k) => [name, cells[k] ?? ""])), place });
  });
  return rows;
}

/** A number of a cell. @throws Error naming the place and the mend */
export function numberIn(row: TableRow, column: string): number {
  const text = row.cells[column] ?? "";
  const value = Number(text);
  if (text === "" || !Number.isFinite(value))
    throw new Error(`${row.place}: ${column} must be a number, not "${text}"`);
  return value;
}

/** A number, or undefined for an empty cell. @throws Error for anything else */
export function optionalNumber(row: TableRow, column: string): number | undefined {
  return row.cells[column] ? numberIn(row, column) : undefined;
}
