/**
 * How fast a carbonyl reaches its hydration equilibrium: k_obs = k_hydration·(1 + 1/K), with water, H⁺ and OH⁻ terms.
 * Acetaldehyde at 25 °C: k_0 6.5×10⁻³ s⁻¹, k_H 930 and k_OH 6×10⁴ M⁻¹ s⁻¹ (Kurz 1967; Bell's review 1966; recalled);
 * formaldehyde: k_h = 2.04×10⁵ exp(−2936/T) s⁻¹ (Winkelman et al. 2002). Other compounds: acetaldehyde's, with a wide bound.
 */

import type { CarbonylSite } from "../compounds/perception/types.ts";
import type { Interval } from "../model/contract.ts";

const ACETALDEHYDE = { water: 6.5e-3, acid: 930, base: 6e4 };
/** Ketones add water slower by about what their equilibrium lacks (a Brønsted-type relation with slope near 0.5). */
const EQUILIBRIUM_SLOPE = 0.5;
const ACETALDEHYDE_LOG_K = 0.08;
/** kJ/mol for the acetaldehyde-like cases. */
const ACTIVATION = 50;
/** A factor each way for the central 95 %: 3 for aldehydes of the kind measured, 10 elsewhere. */
const FACTOR = { near: 3, far: 10 };

export interface ApproachTime {
  readonly halfLife: Interval;
  readonly basis: string;
}

/** Half-life of the approach to equilibrium in water, s; undefined without a hydrate. */
export function approachTime(
  site: CarbonylSite,
  log10K: number,
  temperatureK: number,
  pH: number,
): ApproachTime | undefined {
  const arrhenius = Math.exp(((-ACTIVATION * 1000) / 8.314462618) * (1 / temperatureK - 1 / 298.15));
  const formaldehyde = site.class === "formaldehyde";
  const neighbourly = formaldehyde || site.class === "aliphatic aldehyde";
  const scale = formaldehyde ? 1 : 10 ** (EQUILIBRIUM_SLOPE * (log10K - ACETALDEHYDE_LOG_K)) * arrhenius;
  const water = formaldehyde ? 2.04e5 * Math.exp(-2936 / temperatureK) : ACETALDEHYDE.water * scale;
  const forward =
    water + (formaldehyde ? 1 : scale) * (ACETALDEHYDE.acid * 10 ** -pH + ACETALDEHYDE.base * 10 ** (pH - 14));
  const observed = forward * (1 + 10 ** -log10K);
  if (!(observed > 0) || !Number.isFinite(observed)) return undefined;
  const value = Math.LN2 / observed;
  const factor = neighbourly ? FACTOR.near : FACTOR.far;
  const basis = formaldehyde
    ? "hydration of formaldehyde, Winkelman et al. 2002"
    : `hydration of acetaldehyde (water, H⁺, OH⁻)${neighbourly ? "" : ", scaled by the equilibrium constant"}`;
  return { halfLife: { value, low: value / factor, high: value * factor }, basis };
}
