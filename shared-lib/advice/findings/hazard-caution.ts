/** One sentence of usual caution for reagents that have hurt people. */

import type { AdviceContext, FindingRule, RawFinding } from "../types.ts";

const DEFER = "follow the safety data sheet, local rules and trained staff";

/** By CAS number, from the trade's usual cautions (common practice, no source). */
const CAUTIONS: ReadonlyMap<string, string> = new Map([
  ["50-00-0", "formaldehyde is carcinogenic, sensitising and irritating as vapour: work in a hood"],
  ["107-02-8", "acrolein is very toxic by inhalation, and polymerises violently with acid or base: work in a hood"],
  [
    "684-16-2",
    "hexafluoroacetone is toxic, and its reaction with water is strongly exothermic: add it slowly and cold",
  ],
  ["107-20-0", "chloroacetaldehyde is corrosive and very toxic by every route: gloves, hood"],
  ["78-95-5", "chloroacetone is a lachrymator and toxic through the skin: gloves, hood"],
  ["111-30-8", "glutaraldehyde sensitises lungs and skin: work in a hood"],
  ["4170-30-3", "crotonaldehyde is very toxic by inhalation: work in a hood"],
]);

function cyanideWithAcid(context: AdviceContext): readonly RawFinding[] {
  return context.steps.flatMap(({ charges }) => {
    const cyanide = charges.find(({ compound }) => compound.tags.includes("cyanide"));
    const acid = charges.find(
      ({ compound }) => compound.tags.includes("strong acid") || compound.tags.includes("acid"),
    );
    const mention = cyanide && context.reading.mentions[cyanide.mention];
    if (!cyanide || !acid || !mention) return [];
    const message = `${cyanide.compound.name} with ${acid.compound.name} gives hydrogen cyanide, which kills: ${DEFER}.`;
    return [{ start: mention.start, end: mention.end, mention: cyanide.mention, message, fixes: [] }];
  });
}

export const hazardCaution: FindingRule = {
  code: "hazard/caution",
  severity: "hint",
  title: "A usual caution for a reagent that has hurt people",
  page: `**Looks for** the first charge of formaldehyde, acrolein, hexafluoroacetone, chloroacetaldehyde, chloroacetone, glutaraldehyde or crotonaldehyde in a note, and
for cyanide in one step with an acid.

**Keeps silent** from the second charge on, and on amounts that are not written.

**Why.** One sentence of the usual caution. It replaces nothing: the safety data sheet, local rules and trained staff decide.

**Sources.** Common practice, no source.`,
  look: (context) => {
    const told = new Set<string>();
    const cautions = context.carbonyls.flatMap(({ charge, mention }): readonly RawFinding[] => {
      const { cas } = charge.compound;
      const caution = cas ? CAUTIONS.get(cas) : undefined;
      if (!cas || !caution || told.has(cas) || !charge.total) return [];
      told.add(cas);
      const message = `Caution: ${caution}; ${DEFER}.`;
      return [{ start: mention.start, end: mention.end, mention: charge.mention, message, fixes: [] }];
    });
    return [...cautions, ...cyanideWithAcid(context)];
  },
};
