/** Rewrites figures of one charge in place. */

import type { AmountOf, TextEdit } from "../../model/contract.ts";
import type { Charge } from "../../notes/types.ts";
import { scaledQuantity } from "./number-as-written.ts";

/** Figures that say how much is charged; assay, concentration and density say what it is. */
export const HOW_MUCH: readonly AmountOf[] = ["mass", "volume", "amount", "equivalents"];
export const WEIGHED: readonly AmountOf[] = ["mass", "volume"];
export const COUNTED: readonly AmountOf[] = ["amount", "equivalents"];

/**
 * Edits that multiply every written figure of these kinds, so that they stay consistent with each other.
 *
 * @returns undefined if one of them cannot be rewritten, or none is written
 */
export function scaleCharge(
  text: string,
  charge: Charge,
  kinds: readonly AmountOf[],
  factor: number,
): readonly TextEdit[] | undefined {
  const edits: TextEdit[] = [];
  for (const quantity of charge.amounts) {
    if (!(kinds as readonly string[]).includes(quantity.of)) continue;
    const edit = scaledQuantity(text, quantity, factor);
    if (!edit) return undefined;
    edits.push(edit);
  }
  return edits.length > 0 ? edits : undefined;
}
