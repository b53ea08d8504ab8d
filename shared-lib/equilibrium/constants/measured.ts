/** Measured hydration constants: every published value of a compound, and the one that is used. */

import citations from "../../generated/citations.json" with { type: "json" };
import hydration from "../../generated/hydration.json" with { type: "json" };
import type { ChargeState } from "./types.ts";

export interface MeasuredValue {
  readonly log10: number;
  readonly celsius: number;
  readonly source: string;
  readonly read: string;
  readonly use: boolean;
  /** Only a bound was published. */
  readonly limit?: "<" | ">";
  /** Kept out of the regression, as an external check of it. */
  readonly external?: boolean;
}

export interface MeasuredConstant {
  readonly smiles: string;
  /** Weighted mean of the values in use nearest to 25 °C. */
  readonly log10: number;
  readonly sd: number;
  readonly celsius: number;
  readonly values: readonly MeasuredValue[];
}

const TABLE = hydration as unknown as Readonly<Record<string, readonly MeasuredValue[]>>;
const CITATIONS: Readonly<Record<string, string>> = citations;

/** Standard deviations by how the number came here: read in the source, derived from one, recalled. */
const SD = { source: 0.08, derived: 0.12, recalled: 0.2 } as const;
const LEAST_SD = 0.06;

/** Short citation of a reference key; a row without one says that it was recalled or that the source is secondary. */
export function citationOf(value: MeasuredValue): string {
  const cited = CITATIONS[value.source];
  if (value.read === "recalled") return cited ? `${cited} (recalled)` : "recalled from the literature";
  return cited ?? "secondary source";
}

function combine(smiles: string, rows: readonly MeasuredValue[]): MeasuredConstant | undefined {
  const used = rows.filter((row) => row.use);
  if (used.length === 0) return undefined;
  // One temperature at a time: what is nearest to 25 °C; other temperatures are for van 't Hoff.
  const nearest = Math.min(...used.map((row) => Math.abs(row.celsius - 25)));
  const near = used.filter((row) => Math.abs(row.celsius - 25) <= Math.max(nearest, 6));
  const weights = near.map((row) => 1 / SD[row.read as keyof typeof SD] ** 2);
  const total = weights.reduce((sum, weight) => sum + weight, 0);
  const mean = near.reduce((sum, row, i) => sum + row.log10 * (weights[i] as number), 0) / total;
  const spread =
    near.length > 1 ? Math.sqrt(near.reduce((sum, row) => sum + (row.log10 - mean) ** 2, 0) / (near.length - 1)) : 0;
  const celsius = near.reduce((sum, row, i) => sum + row.celsius * (weights[i] as number), 0) / total;
  return { smiles, log10: mean, sd: Math.max(LEAST_SD, 1 / Math.sqrt(total), spread), celsius, values: rows };
}

/** What was measured for a compound (canonical SMILES) in a charge state, or undefined. */
export function measuredConstant(canonicalSmiles: string, state: ChargeState): MeasuredConstant | undefined {
  const rows = TABLE[`${canonicalSmiles} ${state}`];
  return rows && combine(canonicalSmiles, rows);
}

/** All compounds with a measured constant in a charge state. */
export function measuredCompounds(state: ChargeState): readonly MeasuredConstant[] {
  const ending = ` ${state}`;
  return Object.entries(TABLE)
    .filter(([key]) => key.endsWith(ending))
    .flatMap(([key, rows]) => combine(key.slice(0, -ending.length), rows) ?? []);
}

/** Published bounds (no value) of compounds in a charge state. */
export function measuredLimits(
  state: ChargeState,
): readonly { readonly smiles: string; readonly value: MeasuredValue }[] {
  const ending = ` ${state}`;
  return Object.entries(TABLE)
    .filter(([key]) => key.endsWith(ending))
    .flatMap(([key, rows]) =>
      rows.flatMap((value) => (value.limit ? [{ smiles: key.slice(0, -ending.length), value }] : [])),
    );
}
