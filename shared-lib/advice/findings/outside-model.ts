/** No estimate is given where water or alcohol would matter. */

import type { ResolvedCharge } from "../../flask/types.ts";
import { compositionOf, mediumKind } from "../../media/composition.ts";
import { percent } from "../figures.ts";
import type { AdviceContext, CarbonylView, FindingRule } from "../types.ts";
import { LEAST_SURE } from "./mostly-bound.ts";

/** Everybody knows that a β-dicarbonyl compound is largely enol. */
function isEnol({ compound }: ResolvedCharge): boolean {
  return compound.carbonyl?.sites.every((site) => site.class === "beta-dicarbonyl") ?? false;
}

/** K: the enthalpies and activities behind the figures are carried no further than this. */
const COLDEST_K = 193.15;
const HOTTEST_K = 473.15;

/** Why nothing, or nothing sure, can be said of a charge in water or alcohol. */
function reasonFor(context: AdviceContext, { forms, moment, charge }: CarbonylView): string | undefined {
  if (isEnol(charge)) return undefined;
  if (forms.outside !== undefined) return forms.outside;
  const { temperatureK } = moment.contents;
  if (temperatureK < COLDEST_K || temperatureK > HOTTEST_K) {
    return `${Math.round(temperatureK - 273.15)} °C is outside −80 to 200 °C, where the constants hold`;
  }
  const bound = 1 - forms.free.value;
  const unsure = 1 - forms.free.high < context.settings.boundShare * LEAST_SURE;
  if (bound < context.settings.boundShare || !unsure) return undefined;
  return `between ${percent(1 - forms.free.high)} and ${percent(1 - forms.free.low)} of it is bound here, which decides nothing`;
}

export const outsideModel: FindingRule = {
  code: "estimate/outside-model",
  severity: "hint",
  title: "No sure estimate: the compound or the flask is outside the model",
  page: `**Looks for** a carbonyl charge in a flask with water or alcohol for which the model gives no estimate, whose
temperature is outside −80 to 200 °C, or whose bounds are so wide that they decide nothing, and says why.

**Keeps silent** in dry aprotic media, where nothing binds, on β-dicarbonyl compounds (enols, as everybody knows), and on solvents.

**Why.** A missing figure must not be taken for "all free".

**Sources.** None needed.`,
  look: (context) =>
    context.carbonyls.flatMap((view) => {
      const { moment, mention, charge } = view;
      const reason = reasonFor(context, view);
      if (reason === undefined) return [];
      const kind = mediumKind(compositionOf(moment.contents.solvents, moment.contents.temperatureK));
      if (kind === "aprotic" || kind === "unknown") return [];
      const message = `No sure estimate for ${charge.compound.name}: ${reason}.`;
      return [{ start: mention.start, end: mention.end, mention: charge.mention, message, fixes: [] }];
    }),
};
