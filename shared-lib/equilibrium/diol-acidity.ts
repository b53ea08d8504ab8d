/**
 * pKa of a gem-diol in water at 25 °C: published, else 13.57 − 1.42·ΔΣσ* against ethane-1,1-diol, with the slope of the alcohols RCH2OH
 * (Ballinger, Long, J. Am. Chem. Soc. 1960, 82, 795; recalled). Chloral hydrate 9.8 against 10.0, hexafluoropropane-2,2-diol 6.9 against 6.6.
 */

import type { CarbonylSite } from "../compounds/perception/types.ts";
import { acidityOf } from "../constants/acidities.ts";

const ETHANE_DIOL = 13.57;
const SLOPE = 1.42;
const SIGMA_STAR_H = 0.49;
/** σ* that an acyl, a carboxylate or an aryl on the diol carbon stands for. */
const ACYL = 1.65;
const CARBOXYLATE = -1.06;
const ARYL = 0.61;

/** pKa of the site's hydrate and its standard deviation. */
export function diolAcidity(site: CarbonylSite): { readonly pKa: number; readonly sd: number } {
  const known = site.carboxylate ? undefined : acidityOf(site.parent, "gem-diol", "hydrate");
  if (known) return known;
  const aryl = site.aryl ? ARYL + 0.4 * site.aryl.sigmaPlus : 0;
  const hydrogens = SIGMA_STAR_H * (site.hydrogens - 1);
  const acyl = site.carboxylate ? ACYL * (site.acyl - 1) + CARBOXYLATE : ACYL * site.acyl;
  return { pKa: ETHANE_DIOL - SLOPE * (site.sigmaStar + acyl + aryl + hydrogens), sd: 0.4 };
}
