/** Charge states of the open, unhydrated molecule at a pH: their ratios to the uncharged one. */

import type { CarbonylSite } from "../compounds/perception/types.ts";
import type { Compound } from "../compounds/types.ts";
import { acidityOf } from "../constants/acidities.ts";
import type { ChargeState } from "./constants/types.ts";

export interface StateRatio {
  readonly state: ChargeState;
  /** ln of [state]/[uncharged], both of the unhydrated molecule. */
  readonly ln: number;
  /** Standard deviation of its log10. */
  readonly sd: number;
}

export interface SiteAcidity {
  readonly state: ChargeState;
  readonly pKa: number;
  /** Of the equilibrium mixture of open and hydrated molecules, as a titration sees it; else of the open form alone. */
  readonly apparent: boolean;
  readonly sd: number;
}

/** Usual apparent pKa where the compound's own is not in the table: keto acids of the table 1.3 to 2.5, glyoxylic acid 3.3. */
const KETO_ACID = { pKa: 2.3, sd: 0.4 };
const GLYOXYLIC_LIKE = { pKa: 3.2, sd: 0.3 };
/** Rings with a basic N, by perception's name: the pyridines of the table 3.8 to 4.7, imidazole 2.9; the rest is a judgement. */
const BASIC_RINGS: readonly { readonly ring: string; readonly pKa: number; readonly sd: number }[] = [
  { ring: "pyridine-4", pKa: 4.7, sd: 0.3 },
  { ring: "pyridine", pKa: 3.8, sd: 0.4 },
  { ring: "imidazole", pKa: 2.9, sd: 0.6 },
];

/** The acid–base step that changes the constants of a site, if it has one. */
export function siteAcidity(compound: Compound, site: CarbonylSite): SiteAcidity | undefined {
  const acid = compound.carbonyl?.ionisable.some((group) => group.group === "carboxylic acid") ?? false;
  if (acid && site.acylKinds.includes("acid")) {
    const known = acidityOf(site.parent, "carboxylic acid", "apparent");
    if (known) return { state: "anion", apparent: true, pKa: known.pKa, sd: known.sd };
    const open = acidityOf(site.parent, "carboxylic acid", "oxo");
    if (open) return { state: "anion", apparent: false, pKa: open.pKa, sd: open.sd };
    return { state: "anion", apparent: true, ...(site.hydrogens > 0 ? GLYOXYLIC_LIKE : KETO_ACID) };
  }
  const usual = BASIC_RINGS.find((row) => site.aryl?.ring.startsWith(row.ring));
  if (!usual) return undefined;
  const known = acidityOf(site.parent, "ring N", "apparent");
  return { state: "cation", apparent: true, pKa: known?.pKa ?? usual.pKa, sd: known?.sd ?? usual.sd };
}

/**
 * ln of [charged]/[uncharged] of the open molecule. K(apparent) of an acid is that of the open form times (1 + K of the anion)/(1 + K of the
 * acid), K being the hydration constants.
 *
 * @param hydrated 1 + K_h of the uncharged and of the charged molecule in dilute water
 */
export function openStateRatio(
  acidity: SiteAcidity,
  pH: number,
  hydrated: { readonly uncharged: number; readonly charged: number },
): StateRatio {
  const sign = acidity.state === "anion" ? 1 : -1;
  const ln = Math.LN10 * sign * (pH - acidity.pKa);
  const correction = acidity.apparent ? Math.log(hydrated.uncharged / hydrated.charged) : 0;
  return { state: acidity.state, ln: ln + correction, sd: acidity.sd };
}
