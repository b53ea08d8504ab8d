/** Measured hydration constants: every published value of a compound, and the mean that is used, at 25 °C. */

import { reactionEnthalpy } from "../../constants/enthalpies.ts";
import citations from "../../generated/citations.json" with { type: "json" };
import hydration from "../../generated/hydration.json" with { type: "json" };
import { vantHoff } from "./temperature.ts";
import type { ChargeState } from "./types.ts";

export interface MeasuredValue {
  readonly log10: number;
  readonly celsius: number;
  readonly source: string;
  readonly read: "source" | "derived" | "recalled";
  readonly use: boolean;
  /** Only a bound was published. */
  readonly limit?: "<" | ">";
  /** Kept out of the regression, as an external check of it. */
  readonly external?: boolean;
}

export interface MeasuredConstant {
  readonly smiles: string;
  /** Mean at 25 °C over the sources in use, each source counted once. */
  readonly log10: number;
  readonly sd: number;
  readonly values: readonly MeasuredValue[];
  /** Independent sources in the mean. */
  readonly sources: number;
}

const TABLE = hydration as unknown as Readonly<Record<string, readonly MeasuredValue[]>>;
const CITATIONS: Readonly<Record<string, string>> = citations;

/** Standard deviations by how the number came here: read in the source, derived from one, recalled. */
const SD = { source: 0.08, derived: 0.12, recalled: 0.2 } as const;
const LEAST_SD = 0.06;
const STANDARD_K = 298.15;

/** Short citation of a reference key; a row without one says that it was recalled or that the source is secondary. */
export function citationOf(value: MeasuredValue): string {
  const cited = CITATIONS[value.source];
  if (value.read === "recalled") return cited ? `${cited} (recalled)` : "recalled from the literature";
  return cited ?? "secondary source";
}

interface SourceMean {
  readonly log10: number;
  readonly variance: number;
}

/** Rows that name no reference count as sources of their own. */
function bySource(rows: readonly MeasuredValue[]): readonly (readonly MeasuredValue[])[] {
  const groups = new Map<string, MeasuredValue[]>();
  rows.forEach((row, i) => {
    const key = row.source === "" ? `row ${i}` : row.source;
    const group = groups.get(key);
    if (group) group.push(row);
    else groups.set(key, [row]);
  });
  return [...groups.values()];
}

/** One source at 25 °C: its value nearest to 25 °C, brought there by van 't Hoff. */
function sourceMean(rows: readonly MeasuredValue[], enthalpy: { value: number; sd: number }): SourceMean {
  const nearest = [...rows].sort((a, b) => Math.abs(a.celsius - 25) - Math.abs(b.celsius - 25))[0] as MeasuredValue;
  const change = vantHoff(enthalpy, nearest.celsius + 273.15, STANDARD_K);
  return { log10: nearest.log10 + change.shift, variance: SD[nearest.read] ** 2 + change.sd ** 2 };
}

function combine(parent: string, siteClass: string, rows: readonly MeasuredValue[]): MeasuredConstant | undefined {
  const used = rows.filter((row) => row.use);
  if (used.length === 0) return undefined;
  const enthalpy = reactionEnthalpy("hydration", siteClass, parent);
  const means = bySource(used).map((group) => sourceMean(group, enthalpy));
  const total = means.reduce((sum, mean) => sum + 1 / mean.variance, 0);
  const log10 = means.reduce((sum, mean) => sum + mean.log10 / mean.variance, 0) / total;
  const scatter =
    means.length > 1
      ? Math.sqrt(means.reduce((sum, mean) => sum + (mean.log10 - log10) ** 2, 0) / (means.length - 1))
      : 0;
  const sd = Math.max(LEAST_SD, 1 / Math.sqrt(total), scatter);
  return { smiles: parent, log10, sd, values: rows, sources: means.length };
}

/** What was measured for a compound (canonical SMILES of the uncharged parent) in a charge state, or undefined. */
export function measuredConstant(parent: string, siteClass: string, state: ChargeState): MeasuredConstant | undefined {
  const rows = TABLE[`${parent} ${state}`];
  return rows && combine(parent, siteClass, rows);
}

/** Parents with rows in a charge state. */
export function measuredParents(state: ChargeState): readonly string[] {
  const ending = ` ${state}`;
  return Object.keys(TABLE)
    .filter((key) => key.endsWith(ending))
    .map((key) => key.slice(0, -ending.length));
}

/** Published bounds (no value) of compounds in a charge state. */
export function measuredLimits(
  state: ChargeState,
): readonly { readonly smiles: string; readonly value: MeasuredValue }[] {
  return measuredParents(state).flatMap((smiles) =>
    (TABLE[`${smiles} ${state}`] ?? []).flatMap((value) => (value.limit ? [{ smiles, value }] : [])),
  );
}
