/**
 * The terms of the correlation for log10 K_h at 25 °C: one sum for all classes, so that classes with much data hold up those with
 * little. Each coefficient starts from what is published or known of the trade (mean and error, below) and the fit moves it as far
 * as the measured constants ask for: Bayesian linear regression, `npm run fit`.
 */

import type { CarbonylSite } from "../../compounds/perception/types.ts";
import { ringSigma } from "./ring-sigma.ts";

export interface Term {
  readonly name: string;
  /** What it multiplies, for a site. */
  readonly of: (site: CarbonylSite) => number;
  /** Mean and standard deviation before the fit, and where they come from. */
  readonly prior: { readonly mean: number; readonly sd: number; readonly why: string };
}

/** σ* of H on the Taft scale, for each aldehydic H. */
const SIGMA_STAR_H = 0.49;

const isAryl = (site: CarbonylSite): boolean => site.aryl !== undefined;
const flag = (yes: boolean): number => (yes ? 1 : 0);
const acylCount = (site: CarbonylSite, ...kinds: string[]): number =>
  site.acylKinds.filter((kind) => kinds.includes(kind)).length;
const isArylAldehyde = (site: CarbonylSite): boolean => isAryl(site) && site.hydrogens > 0;
const isArylKetone = (site: CarbonylSite): boolean => isAryl(site) && site.hydrogens === 0 && site.acyl === 0;
const isArylAcyl = (site: CarbonylSite): boolean => isAryl(site) && site.hydrogens === 0 && site.acyl > 0;
const inRing = (site: CarbonylSite, size: number): number => flag(site.ringSize === size);

const TRADE = "order of magnitude, common practice, no source";
const GREENZAID = "Greenzaid, Luz, Samuel, J. Am. Chem. Soc. 1967, 89, 749 (form and slopes; recalled)";
const MCCLELLAND = "McClelland, Coe, J. Am. Chem. Soc. 1983, 105, 2718 (form; numbers refitted)";

export const TERMS: readonly Term[] = [
  {
    name: "aliphatic level",
    of: (site) => flag(!isArylAldehyde(site) && !isArylKetone(site)),
    prior: { mean: -2.81, sd: 0.3, why: GREENZAID },
  },
  {
    name: "Σσ*",
    of: (site) => (isArylKetone(site) || isArylAldehyde(site) ? 0 : site.sigmaStar + SIGMA_STAR_H * site.hydrogens),
    prior: { mean: 1.7, sd: 0.1, why: GREENZAID },
  },
  {
    name: "aldehydic H",
    of: (site) => (isArylAldehyde(site) ? 0 : site.hydrogens),
    prior: { mean: 2.03, sd: 0.2, why: GREENZAID },
  },
  {
    name: "acyl of a ketone or aldehyde",
    of: (site) => acylCount(site, "oxo", "derivative"),
    prior: { mean: 2.7, sd: 0.5, why: "2,3-butanedione against acetone, halved for its two sites" },
  },
  {
    name: "acyl of an acid",
    of: (site) => acylCount(site, "acid", "carboxylate"),
    prior: { mean: 3.0, sd: 0.4, why: "pyruvic acid against acetone" },
  },
  {
    name: "acyl of an ester",
    of: (site) => acylCount(site, "ester"),
    prior: { mean: 3.1, sd: 0.4, why: "methyl pyruvate against acetone" },
  },
  {
    name: "acyl of an amide",
    of: (site) => acylCount(site, "amide"),
    prior: { mean: 2.4, sd: 0.8, why: "σ* of CONH2 (1.66) against COCH3 (1.65) and COOCH3 (2.00)" },
  },
  {
    name: "second acyl",
    of: (site) => Math.max(0, site.acyl - 1),
    prior: { mean: -0.8, sd: 0.6, why: "mesoxalic acid falls short of two acyl groups" },
  },
  {
    name: "carboxylate in place of the acid",
    of: (site) => flag(site.carboxylate === true),
    prior: { mean: -1.4, sd: 0.2, why: "pyruvate against pyruvic acid, Pocker et al. 1969 (read)" },
  },
  {
    name: "C=O two bonds away",
    of: (site) => site.betaAcyl,
    prior: { mean: -0.5, sd: 0.5, why: "enol and hydrogen bond of oxaloacetic acid; sign expected, size open" },
  },
  {
    name: "conjugated C=C or C≡C",
    of: (site) => site.conjugated,
    prior: { mean: -2.8, sd: 0.5, why: "acrolein below 0.05, crotonaldehyde below 0.02 (qualitative)" },
  },
  { name: "three-membered ring", of: (site) => inRing(site, 3), prior: { mean: 5, sd: 1, why: TRADE } },
  { name: "four-membered ring", of: (site) => inRing(site, 4), prior: { mean: 1.2, sd: 0.5, why: TRADE } },
  { name: "five-membered ring", of: (site) => inRing(site, 5), prior: { mean: 0, sd: 0.4, why: TRADE } },
  {
    name: "six-membered ring",
    of: (site) => inRing(site, 6),
    prior: {
      mean: 1,
      sd: 0.4,
      why: "cyanohydrins of cyclohexanone against acetone; order of ring sizes, common practice, no source",
    },
  },
  {
    name: "aryl aldehyde level",
    of: (site) => flag(isArylAldehyde(site)),
    prior: { mean: -2.15, sd: 0.2, why: MCCLELLAND },
  },
  {
    name: "Σσ⁺",
    of: (site) => site.aryl?.sigmaPlus ?? 0,
    prior: { mean: 1.7, sd: 0.15, why: MCCLELLAND },
  },
  {
    name: "effective σ of a heteroaromatic ring",
    of: (site) => (site.aryl ? ringSigma(site.aryl.ring).sigma : 0),
    prior: { mean: 1.7, sd: 0.3, why: "the same slope as Σσ⁺" },
  },
  {
    name: "ortho OH (hydrogen bond)",
    of: (site) => flag(isAryl(site) && (site.aryl?.ortho.includes("OH") ?? false)),
    prior: { mean: -0.5, sd: 0.5, why: "lowers hydration (qualitative); size a judgement" },
  },
  {
    name: "aryl ketone level",
    of: (site) => flag(isArylKetone(site)),
    prior: { mean: -5.1, sd: 0.3, why: "acetone, with what benzaldehyde has less than acetaldehyde" },
  },
  {
    name: "Σσ* of an aryl ketone's other group",
    of: (site) => (isArylKetone(site) ? site.sigmaStar : 0),
    prior: { mean: 2.6, sd: 0.3, why: "trifluoroacetophenone against acetophenone" },
  },
  {
    name: "second aryl",
    of: (site) => (isArylKetone(site) ? (site.aryl?.count ?? 1) - 1 : 0),
    prior: { mean: -1, sd: 0.8, why: "judgement: a second conjugated ring in place of CH3" },
  },
  {
    name: "aryl on an α-acyl site",
    of: (site) => flag(isArylAcyl(site)),
    prior: { mean: -2.3, sd: 0.6, why: "benzaldehyde against acetaldehyde" },
  },
];

/** Residual scatter is estimated for each of these apart. */
export type Family = "aliphatic" | "alpha-acyl" | "aryl aldehyde" | "other";

/** The family by whose scatter a site's error is judged. */
export function familyOf(site: CarbonylSite): Family {
  if (site.acyl > 0) return isAryl(site) ? "other" : "alpha-acyl";
  if (isArylAldehyde(site)) return site.aryl?.ring === "benzene" ? "aryl aldehyde" : "other";
  if (isAryl(site) || site.conjugated > 0 || site.hydrogens === 2) return "other";
  return "aliphatic";
}

/** Another laboratory's value of the same constant differs by about this (acetaldehyde, butanal, acetone: 0.05 to 0.2): the answer's bound holds it too. */
const BETWEEN_LABORATORIES = 0.1;

/** Variance that an interval must hold to contain a constant as it would be measured. */
export const measurementVariance = BETWEEN_LABORATORIES ** 2;

/** Descriptors in the order of TERMS. */
export function featuresOf(site: CarbonylSite): readonly number[] {
  return TERMS.map((term) => term.of(site));
}

/** Several strong groups are not quite additive: error of log K for each unit of σ*. The haloketones and haloaldehydes that the regression never saw show it. */
const PER_SIGMA_STAR = 0.1;
/** The second aldehydic H need not count as much as the first, and only formaldehyde has it: not in the regression. */
const SECOND_HYDROGEN = 0.4;
/** An ortho group, two at most. */
const PER_ORTHO = 0.25;
/** σ* put together from parts misses the table's by 0.11 (root mean square over 70 groups, tests/compounds/perception), times the slope. */
const FROM_PARTS = 0.18;

/** Variance on log10 K beyond the fit's own: what the descriptors leave open. */
export function extraVariance(site: CarbonylSite): number {
  const parts = site.extrapolated ? FROM_PARTS ** 2 : 0;
  const strong = isAryl(site) ? 0 : (PER_SIGMA_STAR * site.sigmaStar) ** 2;
  const second = site.hydrogens === 2 ? SECOND_HYDROGEN ** 2 : 0;
  const ortho = Math.min(site.aryl?.ortho.length ?? 0, 2) * PER_ORTHO ** 2;
  const ring = site.aryl ? (1.7 * ringSigma(site.aryl.ring).sd) ** 2 : 0;
  return parts + strong + second + ortho + ring;
}
