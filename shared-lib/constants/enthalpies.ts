/** Reaction enthalpies in water (enthalpy.tsv): the compound's own, else its class's. */

import table from "../generated/enthalpy.json" with { type: "json" };

export interface ReactionEnthalpy {
  /** kJ/mol */
  readonly value: number;
  readonly sd: number;
  readonly source: string;
}

type Rows = readonly (ReactionEnthalpy & { readonly entropy?: number })[];
const TABLE = table as unknown as Readonly<Record<string, Rows>>;

/** Several published values of one compound are averaged by their errors; their scatter counts as error too. */
function combined(rows: Rows): ReactionEnthalpy {
  const weights = rows.map((row) => 1 / row.sd ** 2);
  const total = weights.reduce((sum, weight) => sum + weight, 0);
  const value = rows.reduce((sum, row, i) => sum + row.value * (weights[i] as number), 0) / total;
  const scatter = Math.sqrt(rows.reduce((sum, row) => sum + (row.value - value) ** 2, 0) / rows.length);
  return { value, sd: Math.max(1 / Math.sqrt(total), scatter), source: rows[0]?.source ?? "" };
}

/**
 * ΔH° of hydration or hemiacetal formation, kJ/mol.
 *
 * @param parent canonical SMILES of the compound, for a value of its own
 */
export function reactionEnthalpy(
  reaction: "hydration" | "hemiacetal",
  siteClass: string,
  parent?: string,
): ReactionEnthalpy {
  const rows =
    (parent === undefined ? undefined : TABLE[`${reaction} ${parent}`]) ??
    TABLE[`${reaction} ${siteClass}`] ??
    TABLE[`${reaction} (other)`];
  return rows ? combined(rows) : { value: -28, sd: 8, source: "mean of the table" };
}
