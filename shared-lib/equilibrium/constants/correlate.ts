/** log10 K_h at 25 °C from the structure alone, with the error that the fit and the descriptors leave. */

import type { CarbonylSite } from "../../compounds/perception/types.ts";
import coefficients from "./coefficients.json" with { type: "json" };
import { protonated } from "./ring-sigma.ts";
import { extraVariance, type Family, familyOf, featuresOf, measurementVariance, TERMS } from "./terms.ts";
import type { ChargeState, NoConstant } from "./types.ts";

export interface Correlated {
  readonly log10: number;
  readonly sd: number;
  readonly name: string;
  /** Descriptors and terms as a chemist reads them. */
  readonly says: string;
}

interface Fit {
  readonly terms: readonly string[];
  readonly beta: readonly number[];
  /** Covariance of beta, row by row. */
  readonly covariance: readonly (readonly number[])[];
  readonly families: Readonly<
    Record<Family, { n: number; rmse: number; looRmse: number; scatter: number; factor: number }>
  >;
}
const FIT: Fit = coefficients;

/** Words for the family in a sentence. */
const FAMILY_NAME: Readonly<Record<Family, string>> = {
  aliphatic: "aliphatic carbonyls",
  "alpha-acyl": "carbonyls with an acyl group beside",
  "aryl aldehyde": "benzaldehydes",
  other: "classes with few measurements",
};

/** The site as it is in that state: a keto acid as carboxylate, a basic ring protonated. */
export function inChargeState(site: CarbonylSite, state: ChargeState): CarbonylSite {
  if (state === "anion" && site.acylKinds.includes("acid")) return { ...site, carboxylate: true };
  const ring = site.aryl && protonated(site.aryl.ring);
  if (state === "cation" && site.aryl && ring) return { ...site, aryl: { ...site.aryl, ring } };
  return site;
}

function variance(x: readonly number[]): number {
  let sum = 0;
  x.forEach((a, i) => {
    if (a !== 0)
      x.forEach((b, j) => {
        if (b !== 0) sum += a * b * (FIT.covariance[i]?.[j] ?? 0);
      });
  });
  return sum;
}

function termsIn(x: readonly number[]): string {
  const parts = x.flatMap((value, i) => {
    const beta = FIT.beta[i] ?? 0;
    const name = TERMS[i]?.name ?? "";
    if (value === 0) return [];
    return [value === 1 ? `${beta.toFixed(2)} (${name})` : `${beta.toFixed(2)} × ${value.toFixed(2)} (${name})`];
  });
  return parts.join(" + ").replaceAll("+ -", "− ").replace(/^-/, "−").replaceAll(" × -", " × −");
}

/**
 * Correlated constant of a site in dilute water at 25 °C. Never reads a measured constant.
 *
 * @returns log10 of [gem-diol]/[C=O] for this one site with its standard deviation, or why there is none
 */
export function correlate(written: CarbonylSite, state: ChargeState): Correlated | NoConstant {
  if (written.class === "beta-dicarbonyl")
    return { outside: "a β-dicarbonyl is largely enol; the hydration of its keto form is not modelled" };
  const site = inChargeState(written, state);
  const x = featuresOf(site);
  const family = familyOf(site);
  const { n, looRmse, scatter, factor } = FIT.families[family];
  const log10 = x.reduce((sum, value, i) => sum + value * (FIT.beta[i] ?? 0), 0);
  const sd = factor * Math.sqrt(scatter ** 2 + measurementVariance + variance(x) + extraVariance(site));
  return {
    log10,
    sd,
    name: `correlation for ${FAMILY_NAME[family]} (n = ${n}, leave-one-out RMSE ${looRmse.toFixed(2)})`,
    says: `log K = ${termsIn(x)}`,
  };
}
