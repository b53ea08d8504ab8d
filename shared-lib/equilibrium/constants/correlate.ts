/** log10 K_h at 25 °C from the structure alone: the fitted lines, and offsets from them for classes with too little data. */

import type { CarbonylSite } from "../../compounds/perception/types.ts";
import coefficients from "./coefficients.json" with { type: "json" };
import { FAMILIES, type Family, familyOf, featuresOf } from "./families.ts";
import type { NoConstant } from "./types.ts";

export interface Correlated {
  readonly log10: number;
  readonly sd: number;
  readonly name: string;
  /** Descriptors and terms as a chemist reads them. */
  readonly says: string;
}

interface FamilyFit {
  readonly beta: readonly number[];
  readonly n: number;
  readonly looRmse: number;
}
const FITS: Readonly<Record<string, FamilyFit>> = coefficients;

function lineOf(family: Family, site: CarbonylSite): Correlated {
  const fit = FITS[family] as FamilyFit;
  const x = featuresOf(family, site);
  const log10 = x.reduce((sum, value, i) => sum + value * (fit.beta[i] ?? 0), 0);
  const terms = FAMILIES[family].terms
    .map((term, i) => (i === 0 ? `${fit.beta[0]}` : `${fit.beta[i]}·${term} (${(x[i] ?? 0).toFixed(2)})`))
    .join(" + ");
  // Few points a line: Student's factor widens the residual scatter (n 8: 1.2, n 21: 1.06).
  const sd = fit.looRmse * (1 + 1.6 / fit.n) + (site.extrapolated ? 0.1 : 0);
  return {
    log10,
    sd,
    name: `${family} line (n = ${fit.n}, leave-one-out RMSE ${fit.looRmse})`,
    says: `log K = ${terms}`,
  };
}

function shifted(base: Correlated, by: number, sd: number, why: string): Correlated {
  return {
    ...base,
    log10: base.log10 + by,
    sd: Math.hypot(base.sd, sd),
    says: `${base.says}; ${by >= 0 ? "+" : "−"}${Math.abs(by).toFixed(2)} ${why}`,
  };
}

/** Ring-nitrogen replacement constants and effective σ⁺ of five-membered rings, against benzaldehyde. Recalled; error 0.3 in σ and more. */
const RING_SIGMA: Readonly<Record<string, number>> = {
  "pyridine-2": 0.8,
  "pyridine-3": 0.62,
  "pyridine-4": 1.0,
  "pyrimidine-2": 1.5,
  "thiazole-2": 1.0,
  thiazole: 0.5,
  "imidazole-2": 0.4,
  "imidazole-4": -0.3,
  "pyrazole-4": -0.5,
  "furan-2": -0.1,
  "furan-3": -0.3,
  "thiophene-2": -0.3,
  "thiophene-3": -0.3,
  "pyrrole-2": -1.2,
  "pyrrole-3": -1.4,
};

/** Strain that the sp3 centre relieves or meets, by ring size, against an open ketone. Six: cyanohydrins of cyclohexanone (common practice, no source). */
const RING_STRAIN: Readonly<Record<number, { by: number; sd: number }>> = {
  3: { by: 5, sd: 1 },
  4: { by: 1, sd: 0.6 },
  5: { by: 0, sd: 0.4 },
  6: { by: 0.6, sd: 0.4 },
};

function arylAldehyde(site: CarbonylSite): Correlated {
  const base = lineOf("aryl aldehyde", site);
  const ring = site.aryl?.ring ?? "benzene";
  if (ring !== "benzene") {
    const sigma = RING_SIGMA[ring] ?? 0;
    const slope = FITS["aryl aldehyde"]?.beta[1] ?? 0;
    return shifted(
      base,
      slope * sigma,
      RING_SIGMA[ring] === undefined ? 0.8 : 0.45,
      `for the ring (${ring}, effective σ ${sigma})`,
    );
  }
  const ortho = site.aryl?.ortho ?? [];
  if (ortho.length === 0) return base;
  // 2-chloro-6-nitrobenzaldehyde (K 0.34) lies on the para-like sum: two ortho groups cost little, but the bound widens.
  if (ortho.includes("OH")) return shifted(base, -0.5, 0.5, "for the hydrogen bond of an ortho OH to the carbonyl");
  return { ...base, sd: Math.hypot(base.sd, 0.3), says: `${base.says}; ortho groups taken as if para` };
}

/** Aryl ketones: acetophenone (log K −5.1) and trifluoroacetophenone (1.89) set the slope on σ* of the other group. */
function arylKetone(site: CarbonylSite): Correlated {
  const sigmaPlus = site.aryl?.sigmaPlus ?? 0;
  const both = site.class === "diaryl ketone";
  const log10 = -5.1 + 2.68 * site.sigmaStar + 1.6 * sigmaPlus - (both ? 1 : 0);
  const sd = both ? 1 : site.class === "trifluoromethyl ketone" ? 0.35 : 0.6;
  return {
    log10,
    sd,
    name: "aryl ketone line through acetophenone and trifluoroacetophenone",
    says: `log K = −5.1 + 2.68·σ*(other group) (${site.sigmaStar.toFixed(2)}) + 1.6·Σσ⁺ (${sigmaPlus.toFixed(2)})`,
  };
}

function withRing(site: CarbonylSite, base: Correlated): Correlated {
  const strain = site.ringSize === undefined ? undefined : RING_STRAIN[site.ringSize];
  return strain ? shifted(base, strain.by, strain.sd, `for the ${site.ringSize}-membered ring`) : base;
}

/**
 * Correlated constant of a site, in dilute water at 25 °C, for the molecule as written.
 *
 * @returns log10 of [gem-diol]/[C=O] for this one site with its standard deviation, or why there is none
 */
export function correlate(site: CarbonylSite): Correlated | NoConstant {
  if (site.class === "beta-dicarbonyl")
    return { outside: "a β-dicarbonyl is largely enol; the hydration of its keto form is not modelled" };
  if (site.carboxylate) {
    const acid = correlate({ ...site, carboxylate: false });
    return "outside" in acid
      ? acid
      : shifted(acid, -1.4, 0.3, "for the carboxylate (pyruvate against pyruvic acid, Pocker et al. 1969)");
  }
  if (site.acyl > 0) {
    const base = lineOf("alpha-acyl", site);
    if (site.class === "vicinal triketone") return withRing(site, { ...base, sd: 0.8 });
    return site.aryl ? shifted(base, -2.3, 0.7, "for the conjugated aryl") : withRing(site, base);
  }
  if (site.class === "aryl aldehyde" || site.class === "heteroaryl aldehyde") return arylAldehyde(site);
  if (site.aryl) return arylKetone(site);
  const base = lineOf("aliphatic", site);
  if (["enal", "enone", "ynal"].includes(site.class))
    return shifted(base, -2.7, 0.6, "for the conjugated multiple bond (acrolein is below 0.05)");
  if (site.class === "formaldehyde") return { ...base, sd: 0.5 };
  return familyOf(site) ? withRing(site, base) : { outside: `no correlation holds for the class ${site.class}` };
}
