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
}

/**
 * Equivalents as the writer counts them: the charge written as 1 equivalent, else the middle of what the charges with both
 * figures say; without any, the smallest reagent is the limiting one.
 *
 * @param charges of one step
 * @param written equivalents as written, by index into the reading's charges
 */
export function equivalentOfStep(
  charges: readonly ResolvedCharge[],
  written: ReadonlyMap<number, number>,
): EquivalentOfStep | undefined {
  const counted = charges.flatMap(({ charge, total }) => {
    const equivalents = written.get(charge);
    return total && equivalents ? [{ charge, equivalents, mol: total.value / equivalents }] : [];
  });
  const one = counted.find(({ equivalents }) => equivalents === 1);
  if (one) return { mol: one.mol, charge: one.charge, by: "written" };
  const sorted = counted.toSorted((a, b) => a.mol - b.mol);
  const middle = sorted[Math.floor((sorted.length - 1) / 2)];
  if (middle) return { mol: middle.mol, charge: middle.charge, by: "written" };
  return smallestReagent(charges);
}

function smallestReagent(charges: readonly ResolvedCharge[]): EquivalentOfStep | undefined {
  let smallest: EquivalentOfStep | undefined;
  for (const { charge, total, compound } of charges) {
    if (!total || compound.solvent !== undefined || compound.tags.some((tag) => HELPERS.has(tag))) continue;
    if (!smallest || total.value < smallest.mol) smallest = { mol: total.value, charge, by: "smallest" };
  }
  return smallest;
}
