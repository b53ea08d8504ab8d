/** Which correlation a site belongs to, and the descriptors that the correlation runs on. */

import type { CarbonylSite } from "../../compounds/perception/types.ts";

export const FAMILIES = {
  /** log K = c + ρ* Σσ* + d·(aldehydic H); form of Greenzaid, Luz, Samuel, J. Am. Chem. Soc. 1967, 89, 749. */
  aliphatic: { fitted: true, terms: ["constant", "Σσ*", "aldehydic H"] },
  /** The same with a term for each acyl group on the carbonyl. */
  "alpha-acyl": { fitted: true, terms: ["constant", "Σσ*", "aldehydic H", "acyl groups"] },
  /** log K = c + ρ⁺ Σσ⁺; form of McClelland, Coe, J. Am. Chem. Soc. 1983, 105, 2718. */
  "aryl aldehyde": { fitted: true, terms: ["constant", "Σσ⁺"] },
} as const;
export type Family = keyof typeof FAMILIES;

const ALIPHATIC = new Set([
  "aliphatic aldehyde",
  "alpha-hetero aldehyde",
  "ketone",
  "cyclic ketone",
  "trifluoromethyl ketone",
  "sugar",
]);

/** The family whose line is fitted on sites like this one; undefined for classes that lean on a line with an offset, or on none. */
export function familyOf(site: CarbonylSite): Family | undefined {
  if (site.acyl > 0) return site.aryl || site.carboxylate ? undefined : "alpha-acyl";
  if (site.class === "aryl aldehyde") return site.aryl && site.aryl.ortho.length > 0 ? undefined : "aryl aldehyde";
  if (site.aryl) return undefined;
  return ALIPHATIC.has(site.class) ? "aliphatic" : undefined;
}

/** σ* of H on the Taft scale, for each aldehydic H. */
const SIGMA_STAR_H = 0.49;

/** Descriptors in the order of the family's terms. */
export function featuresOf(family: Family, site: CarbonylSite): readonly number[] {
  const sum = site.sigmaStar + SIGMA_STAR_H * site.hydrogens;
  switch (family) {
    case "aliphatic":
      return [1, sum, site.hydrogens];
    case "alpha-acyl":
      return [1, sum, site.hydrogens, site.acyl];
    case "aryl aldehyde":
      return [1, site.aryl?.sigmaPlus ?? 0];
  }
}
