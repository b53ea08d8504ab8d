/** The written quantities of one charge, by what they are; only those that can be used as numbers. */

import type { AmountOf } from "../model/contract.ts";
import type { Charge, Quantity } from "../notes/types.ts";
import type { WrittenCount } from "./equivalent-of-step.ts";

export type WrittenQuantities = Readonly<Partial<Record<AmountOf | "density", Quantity>>>;

/** Nothing in a laboratory or a plant lies outside, in g, L, mol or mol/L; beyond, quotients would leave the range of numbers. */
const LEAST = 1e-15;
const MOST = 1e15;

/** A zero, a negative, an unreadable or a senseless figure is no amount; the notes stage has told the writer so. */
export function usable(quantity: Quantity): boolean {
  return quantity.base >= LEAST && quantity.base <= MOST;
}

/** Equivalents and amount of a charge, where equivalents are written. */
export function writtenCount(charge: Charge): WrittenCount | undefined {
  const { equivalents, amount } = writtenQuantities(charge);
  return equivalents ? { equivalents: equivalents.base, ...(amount ? { amount: amount.base } : {}) } : undefined;
}

/** First usable quantity of each kind, in the order of writing. */
export function writtenQuantities(charge: Charge): WrittenQuantities {
  const found: Partial<Record<AmountOf | "density", Quantity>> = {};
  for (const quantity of charge.amounts) {
    const { of } = quantity;
    if (of === "temperature" || of === "time" || of === "pH" || of === "ratio") continue;
    if (!found[of] && usable(quantity)) found[of] = quantity;
  }
  if (found.assay && found.assay.base > 1) delete found.assay;
  return found;
}
