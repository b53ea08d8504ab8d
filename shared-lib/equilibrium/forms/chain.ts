/**
 * Chains HO(CHR–O)n–H and HO(CHR–O)n–R': each end adds one more carbonyl, the dimer step apart from the further ones. The steps are
 * exchanges (2 glycols = longer glycol + water), the same in mole fractions and in concentrations; back-calculated from the
 * distribution of formaldehyde at 40 wt% and 35 °C; weakly exothermic.
 */

import { vantHoff } from "../constants/temperature.ts";
import { pureMolarity } from "../vessel/pure-molarity.ts";
import type { Species } from "./species.ts";

export const CHAIN_SOURCE = "Reuss et al., Ullmann, Formaldehyde (distribution at 40 wt%, 35 °C)";
const DIMER = 2.71;
const FURTHER = 4.23;
const MEASURED_K = 308.15;
const ENTHALPY = { value: -5.5, sd: 4, source: "between −4 and −7 kJ/mol" };

export interface ChainSteps {
  /** ln of the hydration constant of the aldehyde in dilute water. */
  readonly lnHydration: number;
  readonly temperatureK: number;
  readonly longest: number;
  readonly label: string;
  /** Error of log10 of a step. */
  readonly stepSd: number;
}

/** Adds the chains of 2 to `longest` units that grow from a glycol or a hemiacetal of one unit. */
export function addChain(species: Species[], first: Species, steps: ChainSteps): void {
  const part = first.parts[0];
  if (!part) return;
  const shift = Math.LN10 * vantHoff(ENTHALPY, MEASURED_K, steps.temperatureK).shift;
  // One more unit: × step · K_h · [C=O] / [pure water]; the water that the exchange sets free is the one that hydration took.
  const perUnit = steps.lnHydration - Math.log(pureMolarity("water", steps.temperatureK)) + shift;
  const hydrationError = Object.keys(first.errors).find((source) => source.startsWith("hydration"));
  const hydrationSd = hydrationError === undefined ? 0 : (first.errors[hydrationError] ?? 0);
  let ln = first.ln;
  for (let n = 2; n <= steps.longest; n++) {
    ln += perUnit + Math.log(n === 2 ? DIMER : FURTHER);
    const errors: Record<string, number> = { ...first.errors };
    if (hydrationError !== undefined) errors[hydrationError] = n * hydrationSd;
    errors["dimer step"] = steps.stepSd;
    if (n > 2) errors["chain step"] = (n - 2) * steps.stepSd;
    species.push({
      units: n,
      holds: first.holds,
      ln,
      corrections: [...first.corrections],
      errors,
      parts: [{ kind: "oligomer", label: steps.label, share: 1 }],
    });
  }
}
