/** Solvents, buffers, salts, stock media and the tables of the activity model, validated: known kinds, plausible numbers, structures that parse. */
import { createStructureToolkit } from "../../shared-lib/compounds/structure.ts";
import type { CompileTables } from "../compile-tables.mts";
import { numberIn, optionalNumber, readTsv, type TableRow } from "./read-tsv.mts";

const toolkit = createStructureToolkit();
const KINDS = ["water", "alcohol", "acid", "amine", "ketone", "aprotic"];
const NUCLEOPHILES = ["water", "alcohol", "none"];
/** Above this mole fraction of water the limiting activity coefficient is no longer 1/x_sat. */
const HIGHEST_SATURATION = 0.08;
const WATER_MASS = 18.015;

function list(cell: string | undefined): string[] {
  return (cell ?? "")
    .split(";")
    .map((part) => part.trim())
    .filter((part) => part !== "");
}

function oneOf(row: TableRow, column: string, allowed: readonly string[]): string {
  const value = row.cells[column] ?? "";
  if (!allowed.includes(value))
    throw new Error(`${row.place}: ${column} must be one of ${allowed.join(", ")}, not "${value}"`);
  return value;
}

/** "a:1 b:2" or "a:1; b:2" as pairs. @throws Error naming the place for a part without a number */
function pairsIn(row: TableRow, column: string, separator: string): [string, number][] {
  return (row.cells[column] ?? "")
    .split(separator)
    .map((part) => part.trim())
    .filter((part) => part !== "")
    .map((part) => {
      const at = part.lastIndexOf(":");
      const value = Number(part.slice(at + 1));
      if (at < 1 || !Number.isFinite(value))
        throw new Error(`${row.place}: ${column}: "${part}" must be written name:number`);
      return [part.slice(0, at), value];
    });
}

function requireUnique(rows: readonly { readonly key: string }[], what: string): void {
  const seen = new Set<string>();
  for (const { key } of rows) {
    if (seen.has(key)) throw new Error(`two ${what} have the key "${key}"`);
    seen.add(key);
  }
}

/** Mole fraction of water in a solvent that holds `weightPercent` of it, where it is small enough to be used. */
function waterSaturation(row: TableRow, molarMass: number): number | undefined {
  const weightPercent = optionalNumber(row, "water_sat");
  if (weightPercent === undefined) return undefined;
  const water = weightPercent / WATER_MASS;
  const fraction = water / (water + (100 - weightPercent) / molarMass);
  return fraction < HIGHEST_SATURATION ? Number(fraction.toPrecision(3)) : undefined;
}

function splitRange(row: TableRow): [number, number] | undefined {
  const cell = row.cells.splits_C ?? "";
  if (cell === "") return undefined;
  const [from = Number.NaN, to = Number.NaN] = cell.split(":").map(Number);
  if (!(from < to)) throw new Error(`${row.place}: splits_C must be written from:to in °C, not "${cell}"`);
  return [from, to];
}

async function solventRows() {
  const columns = [
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
  ];
  const table = await readTsv("shared-lib/media/solvents.tsv", [
    ...columns,
    "bottle_water",
    "miscible",
    "groups",
    "source",
  ]);
  const rows = table.map((row) => {
    const structure = toolkit.read(row.cells.smiles ?? "");
    if (!structure.ok) throw new Error(`${row.place}: SMILES: ${structure.problem}`);
    const density = numberIn(row, "density_25C");
    if (density < 0.5 || density > 3.5) throw new Error(`${row.place}: a density of ${density} g/mL is no liquid's`);
    const molarMass = Number(structure.molarMass.toFixed(3));
    return {
      key: row.cells.key ?? "",
      name: row.cells.name,
      synonyms: list(row.cells.synonyms),
      smiles: structure.canonicalSmiles,
      cas: row.cells.cas,
      molarMass,
      density,
      densitySlope: numberIn(row, "density_slope"),
      boilingC: optionalNumber(row, "bp_C"),
      meltingC: optionalNumber(row, "mp_C"),
      vaporizationKJ: optionalNumber(row, "vap_kJ"),
      nucleophile: oneOf(row, "nucleophile", NUCLEOPHILES),
      kind: oneOf(row, "kind", KINDS),
      weaklySolvating: !/[NOPS]/i.test(structure.formula.replace(/[A-Z][a-z]/g, "")),
      bottleWater: numberIn(row, "bottle_water"),
      miscible: row.cells.miscible === "yes",
      splits: splitRange(row),
      waterSaturation: waterSaturation(row, molarMass),
      sdLnWaterActivity: optionalNumber(row, "sd_ln_aw") ?? 0.3,
      azeotrope: row.cells.azeotrope || undefined,
      source: row.cells.source,
      groups: pairsIn(row, "groups", " "),
    };
  });
  requireUnique(rows, "solvents");
  return rows;
}

/** Tables of the activity model; a private copy of a main group has the pairs of its original wherever it has none of its own. */
async function unifacTables(solvents: Awaited<ReturnType<typeof solventRows>>) {
  const groupRows = await readTsv("shared-lib/media/unifac-groups.tsv", ["subgroup", "main", "R", "Q", "copy_of"]);
  const subgroups = Object.fromEntries(
    groupRows.map((row) => [row.cells.subgroup ?? "", [numberIn(row, "main"), numberIn(row, "R"), numberIn(row, "Q")]]),
  );
  const copies = new Map(
    groupRows.flatMap((row) => (row.cells.copy_of ? [[numberIn(row, "main"), numberIn(row, "copy_of")] as const] : [])),
  );
  const tables = { published: {}, predicted: {}, own: {} } as Record<string, Record<string, number[]>>;
  for (const row of await readTsv("shared-lib/media/unifac-pairs.tsv", ["m", "n", "a", "b", "c", "table"])) {
    const table = tables[oneOf(row, "table", Object.keys(tables))] as Record<string, number[]>;
    const [a, b, c] = [numberIn(row, "a"), numberIn(row, "b"), numberIn(row, "c")];
    table[`${row.cells.m}-${row.cells.n}`] = c === 0 ? [a, b] : [a, b, c];
  }
  const mains = [...new Set(Object.values(subgroups).map(([main]) => main as number))];
  const original = (main: number): number => copies.get(main) ?? main;
  const complete = (table: Record<string, number[]>): Record<string, number[]> => {
    const result: Record<string, number[]> = {};
    for (const m of mains)
      for (const n of mains) {
        if (m === n) continue;
        const pair =
          tables.own?.[`${m}-${n}`] ?? (original(m) === original(n) ? [0] : table[`${original(m)}-${original(n)}`]);
        if (pair) result[`${m}-${n}`] = pair;
      }
    return result;
  };
  const makeup = Object.fromEntries(
    solvents.flatMap(({ key, groups }) => {
      const unknown = groups.find(([group]) => subgroups[group] === undefined);
      if (unknown)
        throw new Error(
          `shared-lib/media/solvents.tsv: ${key} has the group ${unknown[0]}, which unifac-groups.tsv lacks`,
        );
      return groups.length > 0 ? [[key, Object.fromEntries(groups)]] : [];
    }),
  );
  return {
    subgroups,
    solvents: makeup,
    pairs: complete(tables.published ?? {}),
    predicted: complete(tables.predicted ?? {}),
  };
}

/** The numbers of a cell such as "2.15; 7.20; 12.35". @throws Error naming the place for a part that is none */
function numbers(row: TableRow, column: string): number[] {
  return list(row.cells[column]).map((part) => {
    const value = Number(part);
    if (!Number.isFinite(value)) throw new Error(`${row.place}: ${column}: "${part}" is not a number`);
    return value;
  });
}

async function bufferRows(salts: ReadonlySet<string>) {
  const columns = ["key", "synonyms", "kind", "pKa", "dpKa_dT", "pH_low", "pH_high", "molarity", "salt", "reacts"];
  const rows = (await readTsv("shared-lib/media/buffers.tsv", columns)).map((row) => {
    const low = optionalNumber(row, "pH_low");
    const high = optionalNumber(row, "pH_high");
    const [salt, molality] = (row.cells.salt ?? "").split(":");
    if (salt && !salts.has(salt)) throw new Error(`${row.place}: salt "${salt}" is not in salts.tsv`);
    if (salt && molality !== "sat" && !(Number(molality) > 0))
      throw new Error(`${row.place}: salt must be written name:molality or name:sat`);
    return {
      key: row.cells.key ?? "",
      synonyms: list(row.cells.synonyms),
      kind: oneOf(row, "kind", ["buffer", "medium", "saturated salt"]),
      pKa: numbers(row, "pKa"),
      slopes: numbers(row, "dpKa_dT"),
      pHRange: low === undefined ? undefined : [low, high ?? low],
      molarity: optionalNumber(row, "molarity"),
      salt: salt ? { salt, molality: molality === "sat" ? "saturated" : Number(molality) } : undefined,
      reacts: oneOf(row, "reacts", ["yes", "weak", "no"]),
      note: row.cells.note,
      source: row.cells.source,
    };
  });
  requireUnique(rows, "buffers");
  return rows;
}

function humidity(row: TableRow) {
  const [form, ...rest] = (row.cells.saturated ?? "").split(" ");
  const values = rest.map(Number);
  if (form === "") return undefined;
  if (values.length === 0 || !values.every(Number.isFinite))
    throw new Error(`${row.place}: saturated must be "poly c0 c1 …", "exp A B" or "fixed RH"`);
  if (form === "exp") return { form: "exponential", factor: values[0], kelvin: values[1] };
  if (form === "poly" || form === "fixed") return { form: "polynomial", coefficients: values };
  throw new Error(`${row.place}: saturated must start with poly, exp or fixed, not "${form}"`);
}

async function saltRows() {
  const columns = ["key", "name", "cas", "nu", "osmotic", "sat_molality", "saturated", "source"];
  const rows = (await readTsv("shared-lib/media/salts.tsv", columns)).map((row) => ({
    key: row.cells.key ?? "",
    name: row.cells.name,
    synonyms: list(row.cells.synonyms),
    cas: row.cells.cas,
    particles: numberIn(row, "nu"),
    osmotic: pairsIn(row, "osmotic", " ").map(([molality, coefficient]) => [Number(molality), coefficient]),
    saturation: optionalNumber(row, "sat_molality"),
    humidity: humidity(row),
    source: row.cells.source,
  }));
  requireUnique(rows, "salts");
  return rows;
}

async function stockRows(solvents: ReadonlySet<string>, salts: ReadonlySet<string>) {
  const rows = (await readTsv("shared-lib/media/stock-media.tsv", ["key", "synonyms", "parts", "salts", "pH"])).map(
    (row) => {
      const parts = pairsIn(
        { ...row, cells: { parts: (row.cells.parts ?? "").replace(/(:[0-9.]+) /g, "$1;") } },
        "parts",
        ";",
      );
      const dissolved = pairsIn(row, "salts", ";");
      const stranger = parts.find(([key]) => !solvents.has(key)) ?? dissolved.find(([key]) => !salts.has(key));
      if (stranger) throw new Error(`${row.place}: "${stranger[0]}" is in none of the tables`);
      const total = parts.reduce((sum, [, share]) => sum + share, 0);
      if (Math.abs(total - 1) > 1e-6) throw new Error(`${row.place}: the parts add up to ${total}, not to 1`);
      return {
        key: row.cells.key ?? "",
        synonyms: list(row.cells.synonyms),
        parts,
        salts: dissolved,
        pH: optionalNumber(row, "pH"),
        note: row.cells.note,
        source: row.cells.source,
      };
    },
  );
  requireUnique(rows, "stock media");
  return rows;
}

export const compile: CompileTables = async () => {
  const solvents = await solventRows();
  const salts = await saltRows();
  const saltKeys = new Set(salts.map(({ key }) => key));
  const unifac = await unifacTables(solvents);
  return {
    "solvents.json": JSON.stringify(solvents.map(({ groups: _, ...row }) => row)),
    "buffers.json": JSON.stringify(await bufferRows(saltKeys)),
    "salts.json": JSON.stringify(salts),
    "stock-media.json": JSON.stringify(await stockRows(new Set(solvents.map(({ key }) => key)), saltKeys)),
    "unifac-text.ts": `/** Compiled from shared-lib/media/unifac-*.tsv; decoded at first use. */\nexport const unifacText =\n  ${JSON.stringify(JSON.stringify(unifac))};\n`,
  };
};
