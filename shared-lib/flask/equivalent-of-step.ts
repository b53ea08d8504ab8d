/** What one equivalent stands for in a step, in mol. */

import type { ReagentTag } from "../compounds/tags.ts";
import type { ResolvedCharge } from "./types.ts";

/** Charges that are there to help and are never the limiting reagent of a step. */
const HELPERS: ReadonlySet<ReagentTag> = new Set(["catalyst", "salt", "drying agent", "acid", "strong acid", "base"]);

export interface EquivalentOfStep {
  /** mol */
  readonly mol: number;
  /** Index into the reading's charges of the reagent it is counted against. */
  readonly charge: number;
  /** The writer's own equivalents say so, or it is the smallest reagent. */
  readonly by: "written" | "smallest";
  /** Number of charges whose amount and equivalents say the same. */
  readonly agreeing: number;
}

/** Equivalents, and the amount in mol where one is written, of a charge. */
export interface WrittenCount {
  readonly equivalents: number;
  readonly amount?: number;
}

/** Counts of one step agree within this (rounding). */
const AGREEING = 0.05;

/** Beyond this many counted charges the first ones decide: a note is not a database. */
const MOST_COUNTED = 50;

/**
 * Equivalents as the writer counts them: what most charges with both figures agree on, first of all one written as 1
 * equivalent with its amount; without any, the smallest reagent is the limiting one.
 *
 * @param charges of one step
 * @param written by index into the reading's charges
 */
export function equivalentOfStep(
  charges: readonly ResolvedCharge[],
  written: ReadonlyMap<number, WrittenCount>,
): EquivalentOfStep | undefined {
  const counted = charges.slice(0, MOST_COUNTED).flatMap(({ charge, total }) => {
    const { equivalents, amount = total?.value } = written.get(charge) ?? {};
    return amount && equivalents
      ? [
          {
            charge,
            mol: amount / equivalents,
            sure: (equivalents === 1 ? 0.5 : 0) + (written.get(charge)?.amount ? 0.25 : 0),
          },
        ]
      : [];
  });
  let best: EquivalentOfStep | undefined;
  let most = 0;
  for (const { charge, mol, sure } of counted) {
    const agreeing = counted.filter((other) => Math.abs(other.mol / mol - 1) <= AGREEING).length;
    const weight = agreeing + sure;
    if (weight <= most) continue;
    best = { mol, charge, by: "written", agreeing };
    most = weight;
  }
  return best ?? smallestReagent(charges);
}

function smallestReagent(charges: readonly ResolvedCharge[]): EquivalentOfStep | undefined {
  let smallest: EquivalentOfStep | undefined;
  for (const { charge, total, compound } of charges) {
    if (!total || compound.solvent !== undefined || compound.tags.some((tag) => HELPERS.has(tag))) continue;
    if (!smallest || total.value < smallest.mol) smallest = { mol: total.value, charge, by: "smallest", agreeing: 0 };
  }
  return smallest;
}
