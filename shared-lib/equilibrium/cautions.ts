/** Sentences beside the figures: what else in the vessel takes the carbonyl, and where the figures end. */

import type { ReagentTag } from "../compounds/tags.ts";
import type { Compound } from "../compounds/types.ts";
import { solventByKey } from "../media/solvents.ts";
import type { FormShare } from "../model/contract.ts";
import type { Contents } from "./types.ts";

const BINDS: Readonly<Partial<Record<ReagentTag, string>>> = {
  "primary amine": "forms the imine",
  "secondary amine": "forms the hemiaminal or iminium ion",
  ammonia: "forms the imine and condensates",
  hydroxylamine: "forms the oxime",
  hydrazine: "forms the hydrazone",
  bisulfite: "forms the hydroxysulfonate",
  cyanide: "forms the cyanohydrin",
  thiol: "forms the hemithioacetal",
};
const ACIDIC_PH = 3;

function percent(share: number): string {
  return share > 0.995 ? "more than 99 %" : share < 0.005 ? "less than 1 %" : `${(share * 100).toPrecision(2)} %`;
}

/** What the adduct of a partner would hold, where it was worked out. */
function heldBy(partner: Compound, forms: readonly FormShare[] | undefined): FormShare | undefined {
  return forms?.find((form) => form.label.endsWith(` with ${partner.name}`));
}

/** @param forms those counted; @param beside those with every partner at equilibrium */
function partnerCaution(
  partner: Compound,
  carbonyl: Compound,
  forms: readonly FormShare[],
  beside: readonly FormShare[] | undefined,
): string | undefined {
  const tag = partner.tags.find((candidate) => BINDS[candidate] !== undefined);
  if (!tag) return undefined;
  if (heldBy(partner, forms)) return undefined;
  const held = heldBy(partner, beside);
  if (!held) return `${partner.name} ${BINDS[tag]}: these shares are those before it does.`;
  const { value, low, high } = held.fraction;
  return `${partner.name} ${BINDS[tag]}; at equilibrium it would hold ${percent(value)} (${percent(low)} to ${percent(high)}) of ${carbonyl.name}; these shares are those before it does.`;
}

/** An alcohol and an acid together go on to the acetal, which no constant here counts. */
function acetalCaution(contents: Contents, carbonyl: Compound): string | undefined {
  const alcohol = contents.solvents.find(
    (part) => part.amount > 0 && solventByKey(part.solvent)?.nucleophile === "alcohol",
  );
  if (!alcohol) return undefined;
  const acid = contents.solutes.some(({ compound, amount }) => amount > 0 && compound.tags.includes("strong acid"));
  if (!acid && !(contents.pH !== undefined && contents.pH < ACIDIC_PH)) return undefined;
  const water = contents.solvents.some(
    (part) => part.amount > 0 && solventByKey(part.solvent)?.nucleophile === "water",
  );
  const extent = water ? "as far as the water allows" : "to most of it when little water is there";
  return `Acid and ${alcohol.solvent} turn ${carbonyl.name} into its acetal, ${extent}: what is free here is an upper bound.`;
}

/**
 * Cautions for one carbonyl of the vessel.
 *
 * @param forms its forms as they are counted
 * @param beside its forms with every partner at equilibrium, where that was worked out
 */
export function cautionsOf(
  contents: Contents,
  carbonyl: Compound,
  forms: readonly FormShare[],
  beside: readonly FormShare[] | undefined,
): string[] {
  const partners = contents.solutes.filter(({ amount }) => amount > 0);
  return [
    ...partners.map(({ compound }) => partnerCaution(compound, carbonyl, forms, beside)),
    acetalCaution(contents, carbonyl),
  ].filter((caution): caution is string => caution !== undefined);
}
