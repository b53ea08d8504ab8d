/** Acidity constants of hydrates, keto acids and ring nitrogens (acidity.tsv). */

import table from "../generated/acidity.json" with { type: "json" };

/** Of that form alone, or of the equilibrium mixture as a titration sees it. */
export type AcidForm = "oxo" | "hydrate" | "ring" | "apparent";

export interface AcidityRow {
  /** "gem-diol", "carboxylic acid", "ring N", "amine", "cyclic hemiacetal" … */
  readonly group: string;
  readonly form: AcidForm;
  readonly pKa: number;
  readonly sd: number;
  readonly read: string;
  readonly source: string;
}

const TABLE = table as unknown as Readonly<Record<string, readonly AcidityRow[]>>;

/** Every published pKa of a compound (canonical SMILES of the uncharged parent). */
export function acidityRows(parent: string): readonly AcidityRow[] {
  return TABLE[parent] ?? [];
}

/** Mean of the published values of one group in one form, or undefined. At 25 °C in water. */
export function acidityOf(
  parent: string,
  group: string,
  form: AcidForm,
): { readonly pKa: number; readonly sd: number; readonly source: string } | undefined {
  const rows = acidityRows(parent).filter((row) => row.group === group && row.form === form);
  const [first] = rows;
  if (!first) return undefined;
  const weights = rows.map((row) => 1 / row.sd ** 2);
  const total = weights.reduce((sum, weight) => sum + weight, 0);
  const pKa = rows.reduce((sum, row, i) => sum + row.pKa * (weights[i] as number), 0) / total;
  const scatter = Math.sqrt(rows.reduce((sum, row) => sum + (row.pKa - pKa) ** 2, 0) / rows.length);
  return { pKa, sd: Math.max(1 / Math.sqrt(total), scatter), source: first.source };
}
