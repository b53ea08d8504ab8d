/** What else binds a carbonyl, and rings and oligomers: tables of shared-lib/equilibrium, with the lines fitted through the adduct constants. */
import { createStructureToolkit } from "../../shared-lib/compounds/structure.ts";
import { REAGENT_TAGS } from "../../shared-lib/compounds/tags.ts";
import { FORM_KINDS } from "../../shared-lib/model/contract.ts";
import type { CompileTables } from "../compile-tables.mts";
import { numberIn, optionalNumber, readTsv, type TableRow } from "./read-tsv.mts";

const FOLDER = "shared-lib/equilibrium";
const toolkit = createStructureToolkit();
const READ = new Set(["source", "derived", "recalled", "judgement"]);
/** An error below which no line through so few rows is trusted. */
const LEAST_SCATTER = 0.4;

function canonical(row: TableRow, column = "smiles"): string {
  const reading = toolkit.read(row.cells[column] ?? "");
  if (!reading.ok) throw new Error(`${row.place}: ${column} ${row.cells[column]}: ${reading.problem}`);
  return reading.canonicalSmiles;
}

function oneOf(row: TableRow, column: string, allowed: ReadonlySet<string>): string {
  const value = row.cells[column] ?? "";
  if (!allowed.has(value)) throw new Error(`${row.place}: ${column} must be one of ${[...allowed].join(", ")}`);
  return value;
}

function citation(row: TableRow): string {
  const read = oneOf(row, "read", READ);
  const source = row.cells.source ?? "";
  if (source === "") throw new Error(`${row.place}: no source is named; write what the value rests on`);
  return read === "source" ? source : `${source} (${read})`;
}

interface Point {
  readonly x: number;
  readonly y: number;
}

/** Least squares, with the scatter about the line. */
function line(points: readonly Point[]) {
  const n = points.length;
  const meanX = points.reduce((sum, point) => sum + point.x, 0) / n;
  const meanY = points.reduce((sum, point) => sum + point.y, 0) / n;
  const sxx = points.reduce((sum, point) => sum + (point.x - meanX) ** 2, 0);
  const sxy = points.reduce((sum, point) => sum + (point.x - meanX) * (point.y - meanY), 0);
  const slope = sxy / sxx;
  const intercept = meanY - slope * meanX;
  const squares = points.reduce((sum, point) => sum + (point.y - intercept - slope * point.x) ** 2, 0);
  const scatter = Math.max(LEAST_SCATTER, Math.sqrt(squares / Math.max(1, n - 2)));
  const round = (value: number): number => Number(value.toFixed(4));
  return { slope: round(slope), intercept: round(intercept), scatter: round(scatter), n };
}

async function nucleophiles() {
  const rows = await readTsv(`${FOLDER}/adducts/nucleophiles.tsv`, ["tag", "adduct", "kind", "ready", "pKa"]);
  return rows.map((row) => ({
    tag: oneOf(row, "tag", new Set(REAGENT_TAGS)),
    adduct: row.cells.adduct ?? "",
    kind: oneOf(row, "kind", new Set(FORM_KINDS)),
    ready: oneOf(row, "ready", new Set(["acid", "base"])),
    pKa: numberIn(row, "pKa"),
    ...(optionalNumber(row, "pKa2") === undefined ? {} : { pKa2: numberIn(row, "pKa2") }),
    releasesWater: oneOf(row, "releases_water", new Set(["yes", "no"])) === "yes",
    counted: oneOf(row, "counted", new Set(["yes", "apart"])) === "yes",
  }));
}

async function adducts(tags: ReadonlySet<string>) {
  const rows = await readTsv(`${FOLDER}/adducts/adducts.tsv`, ["partner", "smiles", "log10_K", "sd", "log10_Kh"]);
  const values: Record<string, object> = {};
  const points = new Map<string, Point[]>();
  for (const row of rows) {
    const partner = oneOf(row, "partner", tags);
    const log10 = numberIn(row, "log10_K");
    const enthalpy = numberIn(row, "dH_kJ");
    values[`${canonical(row)} ${partner}`] = { log10, sd: numberIn(row, "sd"), enthalpy, source: citation(row) };
    if (oneOf(row, "fit", new Set(["yes", "no"])) === "yes")
      points.set(partner, [...(points.get(partner) ?? []), { x: numberIn(row, "log10_Kh"), y: log10 }]);
  }
  const lines = Object.fromEntries([...points].map(([partner, list]) => [partner, line(list)]));
  return { values, lines };
}

async function partners() {
  const rows = await readTsv(`${FOLDER}/adducts/partners.tsv`, ["smiles", "pKa", "shift", "sd", "source"]);
  return Object.fromEntries(
    rows.map((row) => [
      canonical(row),
      {
        pKa: numberIn(row, "pKa"),
        shift: numberIn(row, "shift"),
        sd: numberIn(row, "sd"),
        source: row.cells.source ?? "",
      },
    ]),
  );
}

async function oligomers() {
  const rows = await readTsv(`${FOLDER}/forms/oligomers.tsv`, [
    "smiles",
    "label",
    "kind",
    "units",
    "waters",
    "log10_K",
  ]);
  const bySmiles: Record<string, object[]> = {};
  for (const row of rows) {
    canonical(row, "species_smiles");
    const key = canonical(row);
    bySmiles[key] ??= [];
    bySmiles[key].push({
      label: row.cells.label ?? "",
      kind: oneOf(row, "kind", new Set(FORM_KINDS)),
      smiles: row.cells.species_smiles ?? "",
      units: numberIn(row, "units"),
      waters: numberIn(row, "waters"),
      log10: numberIn(row, "log10_K"),
      overOpen: oneOf(row, "basis", new Set(["open", "all monomer"])) === "open",
      enthalpy: numberIn(row, "dH_kJ"),
      sd: numberIn(row, "sd"),
      source: citation(row),
    });
  }
  return bySmiles;
}

export const compile: CompileTables = async () => {
  const kinds = await nucleophiles();
  const found = await adducts(new Set(kinds.map((kind) => kind.tag)));
  return {
    "adducts.json": JSON.stringify({ kinds, ...found, partners: await partners() }),
    "oligomers.json": JSON.stringify(await oligomers()),
  };
};
