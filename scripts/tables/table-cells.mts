/** What the compilers of the constants tables share: references, structures, cells with a fixed set of words. */

import { readFile } from "node:fs/promises";
import { createStructureToolkit } from "../../shared-lib/compounds/structure.ts";
import type { TableRow } from "./read-tsv.mts";

const toolkit = createStructureToolkit();

/** How a number came into a table. */
export const READ = new Set(["source", "recalled", "derived"]);

interface CslItem {
  readonly id: string;
  readonly author?: readonly { readonly family: string }[];
  readonly "container-title"?: string;
  readonly "container-title-short"?: string;
  readonly issued?: { readonly "date-parts": readonly (readonly number[])[] };
  readonly volume?: string;
  readonly page?: string;
}

/** "McClelland, Coe, J. Am. Chem. Soc. 1983, 105, 2718": as a chemist reads it. */
function shortCitation(item: CslItem): string {
  const authors = (item.author ?? []).map((author) => author.family);
  const who = authors.length > 3 ? `${authors[0]} et al.` : authors.join(", ");
  const title = item["container-title-short"] ?? item["container-title"] ?? "";
  const year = item.issued?.["date-parts"][0]?.[0] ?? "";
  return [`${who}, ${title} ${year}`, item.volume, item.page].filter((part) => part).join(", ");
}

/** Short citations of references.json by key. */
export async function citations(): Promise<ReadonlyMap<string, string>> {
  const text = await readFile(new URL("../../shared-lib/constants/references.json", import.meta.url), "utf8");
  return new Map((JSON.parse(text) as CslItem[]).map((item) => [item.id, shortCitation(item)]));
}

/** The row's reference key, empty where it names none. @throws Error for one that references.json lacks */
export function referenceIn(row: TableRow, known: ReadonlyMap<string, string>): string {
  const key = row.cells.source ?? "";
  if (key !== "" && !known.has(key)) throw new Error(`${row.place}: source ${key} is not in references.json`);
  return key;
}

/** A citation to show: the reference, with "recalled" where the number was not read there, or that there is none. */
export function shownSource(row: TableRow, known: ReadonlyMap<string, string>): string {
  const citation = known.get(referenceIn(row, known));
  if (row.cells.read === "recalled") return citation ? `${citation} (recalled)` : "recalled from the literature";
  if (row.cells.read === "derived") return citation ? `derived from ${citation}` : "derived from its neighbours";
  return citation ?? (row.cells.note || "secondary source");
}

function readIn(row: TableRow) {
  const reading = toolkit.read(row.cells.smiles ?? "");
  if (!reading.ok) throw new Error(`${row.place}: SMILES ${row.cells.smiles}: ${reading.problem}`);
  return reading;
}

/** Ions and salts are filed under their uncharged parent: that is how the engine asks for them. */
export function parentIn(row: TableRow): string {
  const reading = readIn(row);
  const parent = reading.carbonyl?.sites[0]?.parent;
  if (parent === undefined) throw new Error(`${row.place}: SMILES ${row.cells.smiles}: ${reading.outside}`);
  return parent;
}

/** Canonical SMILES with its stereo, for tables in which isomers differ. */
export function canonicalIn(row: TableRow): string {
  return readIn(row).canonicalSmiles;
}

/** A cell that must hold one of the words. @throws Error naming the place and the words */
export function oneOf(row: TableRow, column: string, allowed: ReadonlySet<string>): string {
  const value = row.cells[column] ?? "";
  if (!allowed.has(value))
    throw new Error(`${row.place}: ${column} must be one of ${[...allowed].join(", ")}, not "${value}"`);
  return value;
}
