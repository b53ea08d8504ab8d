/** Hemiacetals, ring–chain equilibria, acidity, rates and enthalpies, by structure. */
import type { CompileTables } from "../compile-tables.mts";
import { numberIn, optionalNumber, readTsv, type TableRow } from "./read-tsv.mts";
import { canonicalIn, citations, oneOf, parentIn, READ, shownSource } from "./table-cells.mts";

type Known = ReadonlyMap<string, string>;
type Filed = Record<string, object[]>;

/** Rows under their key, each made by `make`; the word in `read` is checked for all. */
async function filed(
  file: string,
  columns: readonly string[],
  keyOf: (row: TableRow) => string,
  make: (row: TableRow) => object,
): Promise<Filed> {
  const result: Filed = {};
  for (const row of await readTsv(`shared-lib/constants/${file}`, [...columns, "source", "read"])) {
    oneOf(row, "read", READ);
    const key = keyOf(row);
    result[key] ??= [];
    result[key].push(make(row));
  }
  return result;
}

function hemiacetals(known: Known): Promise<Filed> {
  return filed(
    "hemiacetal.tsv",
    ["smiles", "alcohol", "value", "limit", "basis", "T_C", "use"],
    (row) => `${parentIn(row)} ${row.cells.alcohol}`,
    (row) => ({
      value: numberIn(row, "value"),
      basis: oneOf(row, "basis", new Set(["neat", "per molar", "mole fraction", "bound share, equimolar"])),
      celsius: numberIn(row, "T_C"),
      use: oneOf(row, "use", new Set(["yes", "no"])) === "yes",
      limit: oneOf(row, "limit", new Set(["", "<", ">"])),
      read: row.cells.read,
      source: shownSource(row, known),
    }),
  );
}

function ringChains(known: Known): Promise<Filed> {
  return filed("ring-chain.tsv", ["smiles", "closes", "log10_K", "sd", "T_C", "medium"], canonicalIn, (row) => ({
    parent: parentIn(row),
    closes: row.cells.closes,
    log10: numberIn(row, "log10_K"),
    sd: numberIn(row, "sd"),
    celsius: numberIn(row, "T_C"),
    medium: row.cells.medium,
    source: shownSource(row, known),
  }));
}

function acidities(known: Known): Promise<Filed> {
  return filed("acidity.tsv", ["smiles", "group", "form", "pKa", "sd"], parentIn, (row) => ({
    group: row.cells.group,
    form: oneOf(row, "form", new Set(["oxo", "hydrate", "ring", "apparent"])),
    pKa: numberIn(row, "pKa"),
    sd: numberIn(row, "sd"),
    read: row.cells.read,
    source: shownSource(row, known),
  }));
}

function rates(known: Known): Promise<Filed> {
  return filed("kinetics.tsv", ["smiles", "reaction", "catalyst", "k", "unit", "factor", "T_C"], parentIn, (row) => ({
    reaction: row.cells.reaction,
    catalyst: row.cells.catalyst,
    k: numberIn(row, "k"),
    unit: oneOf(row, "unit", new Set(["s-1", "M-1 s-1"])),
    factor: numberIn(row, "factor"),
    celsius: numberIn(row, "T_C"),
    source: shownSource(row, known),
  }));
}

/** Key: the parent structure, or the class where the row speaks of one. */
function enthalpies(known: Known): Promise<Filed> {
  return filed(
    "enthalpy.tsv",
    ["reaction", "compound", "smiles", "class", "dH_kJ", "sd_kJ"],
    (row) => `${row.cells.reaction} ${row.cells.smiles ? parentIn(row) : row.cells.class}`,
    (row) => ({
      value: numberIn(row, "dH_kJ"),
      sd: numberIn(row, "sd_kJ"),
      entropy: optionalNumber(row, "dS_J"),
      source: shownSource(row, known),
    }),
  );
}

export const compile: CompileTables = async () => {
  const known = await citations();
  return {
    "hemiacetal.json": JSON.stringify(await hemiacetals(known)),
    "ring-chain.json": JSON.stringify(await ringChains(known)),
    "acidity.json": JSON.stringify(await acidities(known)),
    "kinetics.json": JSON.stringify(await rates(known)),
    "enthalpy.json": JSON.stringify(await enthalpies(known)),
  };
};
