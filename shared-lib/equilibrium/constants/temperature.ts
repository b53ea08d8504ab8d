/** van 't Hoff: K at another temperature, with the class's enthalpy where the compound's own was not measured. */

import type { SiteClass } from "../../compounds/perception/types.ts";
import { type ReactionEnthalpy, reactionEnthalpy } from "../../constants/enthalpies.ts";

/** J/(mol K), CODATA. */
const GAS_CONSTANT = 8.314462618;

/** ΔH° of gem-diol formation in water. `parent`: canonical SMILES of the compound, for a value of its own. */
export function hydrationEnthalpy(siteClass: SiteClass, parent?: string): ReactionEnthalpy {
  return reactionEnthalpy("hydration", siteClass, parent);
}

/** ΔH° of hemiacetal formation from the free carbonyl and the alcohol. */
export function hemiacetalEnthalpy(siteClass: SiteClass, parent?: string): ReactionEnthalpy {
  return reactionEnthalpy("hemiacetal", siteClass, parent);
}

/** Change of log10 K from `fromK` to `toK`, and what the enthalpy's own error adds. */
export function vantHoff(
  enthalpy: Pick<ReactionEnthalpy, "value" | "sd">,
  fromK: number,
  toK: number,
): { readonly shift: number; readonly sd: number } {
  const perKilojoule = (-1000 / (GAS_CONSTANT * Math.LN10)) * (1 / toK - 1 / fromK);
  return { shift: perKilojoule * enthalpy.value, sd: Math.abs(perKilojoule) * enthalpy.sd };
}
