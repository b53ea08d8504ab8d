/**
 * pKa of a gem-diol: 13.6 − 1.42·Σσ*, anchored on ethane-1,1-diol (13.57) with the slope of the alcohols RCH2OH
 * (Ballinger, Long, J. Am. Chem. Soc. 1960, 82, 795; recalled). Chloral hydrate 9.84 against 10.04, hexafluoropropane-2,2-diol 6.2 against 6.6.
 */

import type { CarbonylSite } from "../compounds/perception/types.ts";

const ETHANE_DIOL = 13.57;
const SLOPE = 1.42;
/** σ* that an acyl or an aryl on the diol carbon stands for. */
const ACYL = 1.65;
const ARYL = 0.61;

/** pKa of the site's hydrate in water at 25 °C and its standard deviation. */
export function diolAcidity(site: CarbonylSite): { readonly pKa: number; readonly sd: number } {
  const aryl = site.aryl ? ARYL + 0.4 * site.aryl.sigmaPlus : 0;
  const hydrogens = Math.max(0, site.hydrogens - 1) * 0.49;
  return { pKa: ETHANE_DIOL - SLOPE * (site.sigmaStar + ACYL * site.acyl + aryl) - 0.6 * hydrogens, sd: 0.4 };
}
