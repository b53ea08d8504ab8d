/** Rate constants of hydration, dehydration and release of oligomers (kinetics.tsv). */

import table from "../generated/kinetics.json" with { type: "json" };

export interface RateRow {
  /** "hydration", "dehydration", "glycol chains", "hemiacetal", "release from dimer" … */
  readonly reaction: string;
  /** "water", "H+", "OH-", or a buffer acid or base. */
  readonly catalyst: string;
  readonly k: number;
  readonly unit: "s-1" | "M-1 s-1";
  /** The central 95 % reaches from k ÷ factor to k × factor. */
  readonly factor: number;
  readonly celsius: number;
  readonly source: string;
}

const TABLE = table as unknown as Readonly<Record<string, readonly RateRow[]>>;

/** Every published rate constant of a compound (canonical SMILES of the uncharged parent). */
export function rateRows(parent: string): readonly RateRow[] {
  return TABLE[parent] ?? [];
}

/** The published rate constant nearest to a temperature, or undefined. */
export function rateOf(parent: string, reaction: string, catalyst: string, celsius = 25): RateRow | undefined {
  return rateRows(parent)
    .filter((row) => row.reaction === reaction && row.catalyst === catalyst)
    .sort((a, b) => Math.abs(a.celsius - celsius) - Math.abs(b.celsius - celsius))[0];
}
