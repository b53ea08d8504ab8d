/** Partners that water or alcohol destroys. */

import type { ReagentTag } from "../../compounds/tags.ts";
import type { ResolvedCharge } from "../../flask/types.ts";

const SENSITIVE: ReadonlySet<ReagentTag> = new Set(["organometallic", "strong hydride", "phosphorus ylide"]);

/** Charges of a step that water destroys, in the order of writing. */
export function sensitivePartners(charges: readonly ResolvedCharge[]): readonly ResolvedCharge[] {
  return charges.filter(({ compound }) => compound.tags.some((tag) => SENSITIVE.has(tag)));
}
