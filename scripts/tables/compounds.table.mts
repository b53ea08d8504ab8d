/** The catalogue: compounds with their perceived structure, supplied forms, and every name that leads to them. */

import { readFragment } from "../../shared-lib/compounds/name-grammar/molecule.ts";
import { createStructureToolkit } from "../../shared-lib/compounds/structure.ts";
import { REAGENT_TAGS } from "../../shared-lib/compounds/tags.ts";
import type { CompileTables } from "../compile-tables.mts";
import { numberIn, optionalNumber, readTsv, type TableRow } from "./read-tsv.mts";

const toolkit = createStructureToolkit();
const TAGS = new Set<string>(REAGENT_TAGS);
const KINDS = new Set(["neat", "solution", "hydrate", "hemiacetal", "acetal", "oligomer", "polymer", "adduct", "salt"]);
const RELEASE = new Set(["at once", "slow", "needs acid or base", "on heating"]);

const list = (cell: string | undefined): string[] =>
  (cell ?? "")
    .split(";")
    .map((part) => part.trim())
    .filter((part) => part !== "");

/** CAS check digit: the weighted sum of the digits from the right, modulo 10. */
function casIn(row: TableRow): string | undefined {
  const cas = row.cells.cas ?? "";
  if (cas === "") return undefined;
  if (!/^\d{2,7}-\d{2}-\d$/.test(cas)) throw new Error(`${row.place}: "${cas}" is not a CAS number`);
  const digits = [...cas.replaceAll("-", "")].reverse().map(Number);
  const sum = digits.slice(1).reduce((total, digit, i) => total + digit * (i + 1), 0);
  if (sum % 10 !== digits[0]) throw new Error(`${row.place}: the check digit of CAS ${cas} is wrong`);
  return cas;
}

function structureIn(row: TableRow) {
  const reading = toolkit.read(row.cells.smiles ?? "");
  if (!reading.ok) throw new Error(`${row.place}: SMILES ${row.cells.smiles}: ${reading.problem}`);
  return reading;
}

function compoundOf(row: TableRow) {
  const reading = structureIn(row);
  const tags = list(row.cells.tags);
  for (const tag of tags) if (!TAGS.has(tag)) throw new Error(`${row.place}: no such tag: ${tag}`);
  const cas = casIn(row);
  const density = optionalNumber(row, "density");
  return {
    compound: {
      id: row.cells.id as string,
      name: row.cells.id as string,
      smiles: reading.canonicalSmiles,
      formula: reading.formula,
      molarMass: Number(reading.molarMass.toFixed(4)),
      ...(cas ? { cas } : {}),
      ...(density === undefined ? {} : { density }),
      tags,
      ...(reading.carbonyl && (tags.includes("aldehyde") || tags.includes("ketone"))
        ? { carbonyl: reading.carbonyl }
        : {}),
      origin: "catalogue",
    },
    names: [row.cells.id as string, ...list(row.cells.synonyms)],
  };
}

function formOf(row: TableRow, known: ReadonlySet<string>) {
  const of = row.cells.of ?? "";
  if (!known.has(of)) throw new Error(`${row.place}: no compound "${of}" in the catalogue`);
  if (!KINDS.has(row.cells.kind ?? "")) throw new Error(`${row.place}: kind must be one of ${[...KINDS].join(", ")}`);
  if (!RELEASE.has(row.cells.release ?? ""))
    throw new Error(`${row.place}: release must be one of ${[...RELEASE].join(", ")}`);
  const carries = list(row.cells.carries).map((part) => {
    const [solvent, share] = part.split(":");
    const massFraction = Number(share);
    if (!solvent || !(massFraction > 0 && massFraction <= 1))
      throw new Error(`${row.place}: carries must read solvent:mass fraction, not "${part}"`);
    return { solvent, massFraction };
  });
  const density = optionalNumber(row, "density");
  const cas = casIn(row);
  return {
    form: {
      id: row.cells.label as string,
      of,
      label: row.cells.label as string,
      kind: row.cells.kind,
      massPerMole: numberIn(row, "mass_per_mole"),
      assay: { value: numberIn(row, "assay"), low: numberIn(row, "assay_low"), high: numberIn(row, "assay_high") },
      ...(density === undefined ? {} : { density }),
      carries,
      boundWater: numberIn(row, "bound_water"),
      ...(cas ? { cas } : {}),
      ...(row.cells.smiles ? { smiles: structureIn(row).canonicalSmiles } : {}),
      release: row.cells.release,
      source: row.cells.source,
    },
    usual: row.cells.usual === "yes",
    names: list(row.cells.names),
  };
}

const GRAMMAR = "shared-lib/compounds/name-grammar";

/** Rows of the name grammar's tables; every fragment must parse and have as many locants as atoms. */
async function grammarRows(): Promise<Record<string, string[][]>> {
  const tables = { parents: "stem", groups: "name", retained: "name" };
  const result: Record<string, string[][]> = {};
  for (const [table, key] of Object.entries(tables)) {
    const rows = await readTsv(`${GRAMMAR}/${table}.tsv`, [key, "smiles", "locants", "free"]);
    result[table] = rows.map((row) => {
      const { smiles = "", locants = "", free = "" } = row.cells;
      if (smiles !== "!") {
        const atoms = readFragment(smiles.replace(/^=/, "")).atoms.length;
        const count = locants === "" || locants === "-" ? atoms : locants.split(" ").length;
        if (count !== atoms) throw new Error(`${row.place}: ${count} locants for ${atoms} atoms`);
      }
      return [row.cells[key] as string, smiles, locants, free];
    });
  }
  return result;
}

export const compile: CompileTables = async () => {
  const columns = ["id", "synonyms", "smiles", "cas", "density", "tags"];
  const rows = [
    ...(await readTsv("shared-lib/compounds/carbonyls.tsv", columns)),
    ...(await readTsv("shared-lib/compounds/other-reagents.tsv", columns)),
  ];
  const compounds = rows.map(compoundOf);
  const known = new Set(compounds.map(({ compound }) => compound.id));
  const forms = (
    await readTsv("shared-lib/compounds/supplied-forms.tsv", [
      "of",
      "label",
      "names",
      "kind",
      "mass_per_mole",
      "assay",
      "release",
      "source",
    ])
  ).map((row) => formOf(row, known));
  const grammar = await grammarRows();
  return {
    "name-grammar.json": JSON.stringify(grammar),
    "compounds.json": JSON.stringify(compounds),
    "supplied-forms.json": JSON.stringify(forms),
  };
};
