/**
 * How fast a carbonyl reaches its hydration equilibrium: the sum of hydration and dehydration, k·(1 + 1/K), with water, H⁺, OH⁻ and
 * buffer terms. Hydration of acetaldehyde at 25 °C: water 6.5×10⁻³ s⁻¹, H⁺ 930 and OH⁻ 6×10⁴ M⁻¹ s⁻¹ (Bell and co-workers; Kurz, Coburn 1967;
 * recalled, within a factor of 2). Formaldehyde: 2.04×10⁵·exp(−2936/T) s⁻¹ (Winkelman et al. 2002, read), H⁺ and OH⁻ from dehydration of
 * methanediol, 2.7 and 1.6×10³ M⁻¹ s⁻¹ (Bell, Evans 1966, recalled) times K. Pyruvic acid: H⁺ 5.6 M⁻¹ s⁻¹ (Griffiths, Socrates 1967, read).
 */

import type { CarbonylSite } from "../compounds/perception/types.ts";
import type { Compound } from "../compounds/types.ts";
import { rateOf } from "../constants/rates.ts";
import { bufferByKey } from "../media/buffers.ts";
import type { Interval } from "../model/contract.ts";
import type { Contents } from "./types.ts";

/** A rate constant of the table at 25 °C; `parent` as the structure toolkit writes it. */
function tabled(parent: string, reaction: string, catalyst: string): number {
  return rateOf(parent, reaction, catalyst)?.k ?? 0;
}

const ACETALDEHYDE = {
  water: tabled("CC=O", "hydration", "water"),
  acid: tabled("CC=O", "hydration", "H+"),
  base: tabled("CC=O", "hydration", "OH-"),
};
const ACETALDEHYDE_LOG_K = 0.08;
const METHANEDIOL = { acid: tabled("C=O", "dehydration", "H+"), base: tabled("C=O", "dehydration", "OH-") };
/** Its water and OH⁻ terms are judgements: of the size of acetaldehyde's. */
const PYRUVIC = { water: 2e-2, acid: tabled("CC(C(O)=O)=O", "hydration", "H+"), base: ACETALDEHYDE.base };
/** Rates rise with the equilibrium constant, by about half of it on a log scale (slope of rate–equilibrium relations near 0.5). */
const EQUILIBRIUM_SLOPE = 0.5;
/** kJ/mol, for all but formaldehyde's water term. */
const ACTIVATION = 50;
/**
 * A mol/L of a buffer whose pKa lies near the pH adds this, as a multiple of the water term: general acid and base catalysis with
 * slopes near 0.5 (Bell, Higginson 1949) raise acetaldehyde's rate by 10 to 100 times per mol/L between pH 4 and 8.
 */
const BUFFER_PER_MOLAR = 40;
/** s⁻¹: beyond this the terms are extrapolated far outside where they were measured, and "at once" is all that can be said. */
const FASTEST = 1000;
/** A factor each way for the central 95 %. */
const FACTOR = { near: 3, far: 10, buffered: 5 };
const GAS_CONSTANT = 8.314462618;

export interface ApproachTime {
  readonly halfLife: Interval;
  readonly basis: string;
}

/** Hydration terms at a temperature: s⁻¹, M⁻¹ s⁻¹, M⁻¹ s⁻¹. */
interface Rates {
  readonly water: number;
  readonly acid: number;
  readonly base: number;
}

function scaled(rates: Rates, by: number): Rates {
  return { water: rates.water * by, acid: rates.acid * by, base: rates.base * by };
}

function ratesOf(site: CarbonylSite, log10K: number, temperatureK: number): Rates {
  const warmer = Math.exp(((-ACTIVATION * 1000) / GAS_CONSTANT) * (1 / temperatureK - 1 / 298.15));
  if (site.class === "formaldehyde") {
    const k = 10 ** log10K * warmer;
    return { water: 2.04e5 * Math.exp(-2936 / temperatureK), acid: METHANEDIOL.acid * k, base: METHANEDIOL.base * k };
  }
  if (site.class === "alpha-keto acid") return scaled(PYRUVIC, warmer);
  return scaled(ACETALDEHYDE, warmer * 10 ** (EQUILIBRIUM_SLOPE * (log10K - ACETALDEHYDE_LOG_K)));
}

function bufferMolarity(contents: Contents): number {
  const { buffer } = contents;
  if (!buffer) return 0;
  return Math.max(0, Math.min(2, buffer.molarity ?? bufferByKey(buffer.buffer)?.molarity ?? 0));
}

function basisOf(compound: Compound, site: CarbonylSite, buffered: boolean): string {
  const buffer = buffered ? ", and the buffer" : "";
  if (site.class === "formaldehyde") return `hydration of formaldehyde, Winkelman et al. 2002${buffer}`;
  if (site.class === "alpha-keto acid") return `hydration of pyruvic acid (water, H⁺, OH⁻)${buffer}`;
  const scaledBy = compound.smiles === "CC=O" ? "" : ", scaled by the equilibrium constant";
  return `hydration of acetaldehyde (water, H⁺, OH⁻)${scaledBy}${buffer}`;
}

/** Half-life of the approach to equilibrium in water, s, with central 95 % bounds; undefined where nothing finite comes out. */
export function approachTime(
  compound: Compound,
  site: CarbonylSite,
  log10K: number,
  contents: Contents,
  pH: number,
): ApproachTime | undefined {
  const rates = ratesOf(site, log10K, contents.temperatureK);
  const molarity = bufferMolarity(contents);
  const forward =
    rates.water * (1 + BUFFER_PER_MOLAR * molarity) + rates.acid * 10 ** -pH + rates.base * 10 ** (pH - 14);
  const observed = Math.min(FASTEST, forward * (1 + 10 ** -log10K));
  if (!(observed > 0) || !Number.isFinite(observed)) return undefined;
  const value = Math.LN2 / observed;
  const near = site.class === "formaldehyde" || site.class === "aliphatic aldehyde";
  const factor = near ? (molarity > 0.02 ? FACTOR.buffered : FACTOR.near) : FACTOR.far;
  return {
    halfLife: { value, low: value / factor, high: value * factor },
    basis: basisOf(compound, site, molarity > 0.02),
  };
}
