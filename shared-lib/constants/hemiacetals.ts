/** Published hemiacetal constants (hemiacetal.tsv), brought to the neat alcohol at 25 °C. */

import table from "../generated/hemiacetal.json" with { type: "json" };

export interface HemiacetalRow {
  readonly value: number;
  readonly basis: "neat" | "per molar" | "mole fraction" | "bound share, equimolar";
  readonly celsius: number;
  readonly use: boolean;
  readonly limit: "" | "<" | ">";
  readonly read: string;
  readonly source: string;
}

export interface MeasuredHemiacetal {
  /** log10 of [hemiacetal]/[C=O] in the neat alcohol at 25 °C. */
  readonly log10: number;
  readonly sd: number;
  readonly rows: readonly HemiacetalRow[];
}

const TABLE = table as unknown as Readonly<Record<string, readonly HemiacetalRow[]>>;

/** mol/L of the neat alcohols whose constants were published per molar. */
const NEAT_MOLARITY: Readonly<Record<string, number>> = { methanol: 24.55, ethanol: 17.05 };
/** What the step from one basis to the other is good to, in log10: activity of the alcohol between dilute water and neat. */
const CONVERSION_SD = { neat: 0, "per molar": 0.25, "mole fraction": 0.15 } as const;
const READ_SD: Readonly<Record<string, number>> = { source: 0.08, derived: 0.15, recalled: 0.2 };
const WIDEST_TEMPERATURE_STEP = 6;

/** log10 in the neat alcohol; a per-molar constant times its molarity, a mole-fraction constant at x = 1. */
function inNeat(row: HemiacetalRow, alcohol: string): { log10: number; sd: number } | undefined {
  if (!row.use || row.limit !== "" || row.basis === "bound share, equimolar") return undefined;
  if (Math.abs(row.celsius - 25) > WIDEST_TEMPERATURE_STEP) return undefined;
  const molarity = row.basis === "per molar" ? NEAT_MOLARITY[alcohol] : 1;
  if (molarity === undefined) return undefined;
  const sd = Math.hypot(CONVERSION_SD[row.basis], READ_SD[row.read] ?? 0.2);
  return { log10: Math.log10(row.value * molarity), sd };
}

/** Mean of what was published for a carbonyl compound (parent SMILES) and an alcohol (key of the solvents table), or undefined. */
export function measuredHemiacetal(parent: string, alcohol: string): MeasuredHemiacetal | undefined {
  const rows = TABLE[`${parent} ${alcohol}`] ?? [];
  const used = rows.flatMap((row) => {
    const found = inNeat(row, alcohol);
    return found ? [{ row, ...found }] : [];
  });
  if (used.length === 0) return undefined;
  const weights = used.map((entry) => 1 / entry.sd ** 2);
  const total = weights.reduce((sum, weight) => sum + weight, 0);
  const log10 = used.reduce((sum, entry, i) => sum + entry.log10 * (weights[i] as number), 0) / total;
  const scatter = Math.sqrt(used.reduce((sum, entry) => sum + (entry.log10 - log10) ** 2, 0) / used.length);
  return { log10, sd: Math.max(1 / Math.sqrt(total), scatter, 0.08), rows: used.map((entry) => entry.row) };
}
