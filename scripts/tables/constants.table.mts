/** Hydration constants by canonical structure and charge state, hemiacetal constants, and the references they name. */
import { readFile } from "node:fs/promises";
import { createStructureToolkit } from "../../shared-lib/compounds/structure.ts";
import type { CompileTables } from "../compile-tables.mts";
import { numberIn, readTsv, type TableRow } from "./read-tsv.mts";

const toolkit = createStructureToolkit();
const READ = new Set(["source", "recalled", "derived"]);
const STATES = new Set(["neutral", "anion", "cation"]);

interface CslItem {
  readonly id: string;
  readonly author?: readonly { readonly family: string }[];
  readonly "container-title"?: string;
  readonly issued?: { readonly "date-parts": readonly (readonly number[])[] };
  readonly volume?: string;
  readonly page?: string;
}

async function references(): Promise<Map<string, CslItem>> {
  const items = JSON.parse(
    await readFile(new URL("../../shared-lib/constants/references.json", import.meta.url), "utf8"),
  ) as CslItem[];
  return new Map(items.map((item) => [item.id, item]));
}

/** "McClelland, Coe, J. Am. Chem. Soc. 1983, 105, 2718": as a chemist reads it. */
function shortCitation(item: CslItem): string {
  const authors = (item.author ?? []).map((author) => author.family);
  const who = authors.length > 3 ? `${authors[0]} et al.` : authors.join(", ");
  const year = item.issued?.["date-parts"][0]?.[0] ?? "";
  return [`${who}, ${item["container-title"] ?? ""} ${year}`, item.volume, item.page].filter((part) => part).join(", ");
}

/** Ions and salts are filed under their uncharged parent, with their state: that is how the engine asks for them. */
function parentIn(row: TableRow): string {
  const reading = toolkit.read(row.cells.smiles ?? "");
  if (!reading.ok) throw new Error(`${row.place}: SMILES ${row.cells.smiles}: ${reading.problem}`);
  const parent = reading.carbonyl?.sites[0]?.parent;
  if (parent === undefined) throw new Error(`${row.place}: SMILES ${row.cells.smiles}: ${reading.outside}`);
  return parent;
}

function oneOf(row: TableRow, column: string, allowed: ReadonlySet<string>): string {
  const value = row.cells[column] ?? "";
  if (!allowed.has(value))
    throw new Error(`${row.place}: ${column} must be one of ${[...allowed].join(", ")}, not "${value}"`);
  return value;
}

export const compile: CompileTables = async () => {
  const known = await references();
  const cited = (row: TableRow): string => {
    const key = row.cells.source ?? "";
    if (key !== "" && !known.has(key)) throw new Error(`${row.place}: source ${key} is not in references.json`);
    return key;
  };
  const hydration: Record<string, object[]> = {};
  for (const row of await readTsv("shared-lib/constants/hydration.tsv", [
    "name",
    "smiles",
    "state",
    "log10_K",
    "T_C",
    "source",
    "read",
    "use",
    "limit",
    "fit",
  ])) {
    const key = `${parentIn(row)} ${oneOf(row, "state", STATES)}`;
    const limit = oneOf(row, "limit", new Set(["", ">", "<"]));
    hydration[key] ??= [];
    hydration[key].push({
      log10: numberIn(row, "log10_K"),
      celsius: numberIn(row, "T_C"),
      source: cited(row),
      read: oneOf(row, "read", READ),
      use: oneOf(row, "use", new Set(["yes", "no"])) === "yes" && limit === "",
      ...(limit === "" ? {} : { limit }),
      ...(oneOf(row, "fit", new Set(["", "no"])) === "no" ? { external: true } : {}),
    });
  }
  const terms: Record<string, object> = {};
  for (const row of await readTsv("shared-lib/constants/alcohol-terms.tsv", [
    "alcohol",
    "log10_ratio",
    "sd",
    "source",
    "read",
  ])) {
    const key = cited(row);
    const citation = key === "" ? undefined : shortCitation(known.get(key) as CslItem);
    const read = oneOf(row, "read", new Set(["source", "recalled", "judgement"]));
    terms[row.cells.alcohol as string] = {
      log10: numberIn(row, "log10_ratio"),
      sd: numberIn(row, "sd"),
      source:
        citation ??
        (read === "recalled" ? "recalled from the literature" : "our judgement from its neighbours, wide bound"),
    };
  }
  const citations = Object.fromEntries([...known].map(([id, item]) => [id, shortCitation(item)]));
  return {
    "hydration.json": JSON.stringify(hydration),
    "alcohol-terms.json": JSON.stringify(terms),
    "citations.json": JSON.stringify(citations),
  };
};
