/** Solvents and buffers, validated: known kinds, plausible numbers, structures that parse. */
import { readFile } from "node:fs/promises";
import { createStructureToolkit } from "../../shared-lib/compounds/structure.ts";
import type { CompileTables } from "../compile-tables.mts";
import { numberIn, optionalNumber, readTsv } from "./read-tsv.mts";

const toolkit = createStructureToolkit();
const KINDS = ["water", "alcohol", "acid", "amine", "ketone", "aprotic"];
const COLUMNS = [
  "key",
  "name",
  "synonyms",
  "smiles",
  "cas",
  "density_25C",
  "density_slope",
  "bp_C",
  "mp_C",
  "nucleophile",
  "kind",
  "bottle_water",
  "miscible",
  "source",
];

function list(cell: string | undefined): string[] {
  return (cell ?? "")
    .split(";")
    .map((part) => part.trim())
    .filter((part) => part !== "");
}

/** The numbers of a cell such as "2.15; 7.20; 12.35"; a part without a digit ("-", "see note") is none. */
function numbers(cell: string | undefined): number[] {
  return list(cell).flatMap((part) => {
    const value = Number.parseFloat(part.replace(/[^0-9.-]/g, ""));
    return Number.isFinite(value) ? [value] : [];
  });
}

export const compile: CompileTables = async () => {
  const solvents = (await readTsv("shared-lib/media/solvents.tsv", COLUMNS)).map((row) => {
    const structure = toolkit.read(row.cells.smiles ?? "");
    if (!structure.ok) throw new Error(`${row.place}: SMILES: ${structure.problem}`);
    if (!KINDS.includes(row.cells.kind ?? "")) throw new Error(`${row.place}: kind must be one of ${KINDS.join(", ")}`);
    return {
      key: row.cells.key,
      name: row.cells.name,
      synonyms: list(row.cells.synonyms),
      smiles: structure.canonicalSmiles,
      cas: row.cells.cas,
      molarMass: Number(structure.molarMass.toFixed(3)),
      density: numberIn(row, "density_25C"),
      densitySlope: numberIn(row, "density_slope"),
      boilingC: optionalNumber(row, "bp_C"),
      meltingC: optionalNumber(row, "mp_C"),
      nucleophile: row.cells.nucleophile,
      kind: row.cells.kind,
      bottleWater: numberIn(row, "bottle_water"),
      miscible: row.cells.miscible === "yes",
      source: row.cells.source,
    };
  });
  const buffers = (await readTsv("shared-lib/media/buffers.tsv", ["key", "synonyms", "kind", "pKa", "pH"])).map(
    (row) => ({
      key: row.cells.key,
      synonyms: list(row.cells.synonyms),
      kind: row.cells.kind,
      pKa: numbers(row.cells.pKa),
      slopes: numbers(row.cells.dpKa_dT),
      pH: row.cells.pH,
      reacts: row.cells.reacts !== "no",
      waterActivity: Number.parseFloat(row.cells.water_activity ?? ""),
      note: row.cells.note,
      source: row.cells.source,
    }),
  );
  const unifac = JSON.parse(
    await readFile(new URL("../../shared-lib/media/unifac-dortmund.json", import.meta.url), "utf8"),
  ) as object;
  return {
    "solvents.json": JSON.stringify(solvents),
    "buffers.json": JSON.stringify(buffers),
    "unifac.json": JSON.stringify(unifac),
  };
};
