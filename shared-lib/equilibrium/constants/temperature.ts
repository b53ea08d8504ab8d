/** van 't Hoff: K at another temperature, with the class's enthalpy where the compound's own was not measured. */

import type { SiteClass } from "../../compounds/perception/types.ts";

/** J/(mol K), CODATA. */
const GAS_CONSTANT = 8.314462618;

export interface ReactionEnthalpy {
  /** kJ/mol */
  readonly value: number;
  readonly sd: number;
  readonly source: string;
}

/**
 * ΔH° of gem-diol formation by class. Acetaldehyde −20.4 and propanal −22.9 kJ/mol (Nakazawa, Takahashi 1999), formaldehyde −31.3
 * (Winkelman et al. 2002), pyruvic acid −32.6 (Pocker et al. 1969). The others take the aliphatic mean with a wider spread.
 */
export function hydrationEnthalpy(siteClass: SiteClass): ReactionEnthalpy {
  if (siteClass === "formaldehyde") return { value: -31.3, sd: 2, source: "Winkelman et al. 2002" };
  if (siteClass.startsWith("alpha-keto")) return { value: -32.6, sd: 4, source: "Pocker et al. 1969 (pyruvic acid)" };
  if (siteClass === "aliphatic aldehyde") return { value: -21.7, sd: 3, source: "Nakazawa, Takahashi 1999" };
  return { value: -23, sd: 7, source: "mean of the aldehydes and keto acids measured" };
}

/** ΔH° of hemiacetal formation from the aldehyde: formaldehyde + methanol −29.2 kJ/mol (Schmitz et al. 2015); else as hydration. */
export function hemiacetalEnthalpy(siteClass: SiteClass): ReactionEnthalpy {
  if (siteClass === "formaldehyde") return { value: -29.2, sd: 3, source: "Schmitz et al. 2015" };
  return { value: -28, sd: 8, source: "from formaldehyde–methanol and the hydrations, wide" };
}

/** Change of log10 K from `fromK` to `toK`, and what the enthalpy's own error adds. */
export function vantHoff(
  enthalpy: ReactionEnthalpy,
  fromK: number,
  toK: number,
): { readonly shift: number; readonly sd: number } {
  const perKilojoule = (-1000 / (GAS_CONSTANT * Math.LN10)) * (1 / toK - 1 / fromK);
  return { shift: perKilojoule * enthalpy.value, sd: Math.abs(perKilojoule) * enthalpy.sd };
}
