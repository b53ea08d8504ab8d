/** No estimate is given where water or alcohol would matter. */

import type { ResolvedCharge } from "../../flask/types.ts";
import { compositionOf, mediumKind } from "../../media/composition.ts";
import type { FindingRule } from "../types.ts";

/** Everybody knows that a β-dicarbonyl compound is largely enol. */
function isEnol({ compound }: ResolvedCharge): boolean {
  return compound.carbonyl?.sites.every((site) => site.class === "beta-dicarbonyl") ?? false;
}

export const outsideModel: FindingRule = {
  code: "estimate/outside-model",
  severity: "hint",
  title: "No estimate: the compound or the flask is outside the model",
  page: `**Looks for** a carbonyl charge in a flask with water or alcohol for which the model gives no estimate, and says why.

**Keeps silent** in dry aprotic media, where nothing binds, on β-dicarbonyl compounds (enols, as everybody knows), and on solvents.

**Why.** A missing figure must not be taken for "all free".

**Sources.** None needed.`,
  look: ({ carbonyls }) =>
    carbonyls.flatMap(({ forms, moment, mention, charge }) => {
      if (forms.outside === undefined || isEnol(charge)) return [];
      const kind = mediumKind(compositionOf(moment.contents.solvents, moment.contents.temperatureK));
      if (kind === "aprotic" || kind === "unknown") return [];
      const message = `No estimate for ${charge.compound.name}: ${forms.outside}`;
      return [{ start: mention.start, end: mention.end, mention: charge.mention, message, fixes: [] }];
    }),
};
