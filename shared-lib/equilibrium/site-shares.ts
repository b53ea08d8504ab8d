/** Shares of every form at every site of a compound, at one composition of free solvents, weighted over its charge states. */

import type { CarbonylSite } from "../compounds/perception/types.ts";
import type { Compound } from "../compounds/types.ts";
import type { Composition } from "../media/composition.ts";
import type { Interval } from "../model/contract.ts";
import { chargeStates } from "./charge-state.ts";
import { hydrationConstant } from "./constants/hydration.ts";
import type { ConstantEstimate } from "./constants/types.ts";
import { type Shares, sharesOf } from "./shares.ts";
import { type SiteRatios, siteRatios } from "./site-ratios.ts";
import type { SpeciateOptions } from "./types.ts";

export interface SiteShares {
  readonly descriptor: CarbonylSite;
  /** Of the state that dominates. */
  readonly hydration: ConstantEstimate;
  readonly site: SiteRatios;
  readonly shares: Shares;
}

function weighted(intervals: readonly Interval[], weights: readonly number[]): Interval {
  const sum = (pick: (interval: Interval) => number): number =>
    intervals.reduce((total, interval, i) => total + pick(interval) * (weights[i] as number), 0);
  return {
    value: sum((interval) => interval.value),
    low: sum((interval) => interval.low),
    high: sum((interval) => interval.high),
  };
}

/** The same site in another charge state of the molecule: a keto acid as its anion. */
function inState(site: CarbonylSite, state: string): CarbonylSite {
  return state === "anion" && site.acyl > 0 && !site.carboxylate ? { ...site, carboxylate: true } : site;
}

function equivalents(sites: readonly CarbonylSite[], site: CarbonylSite): number {
  return sites.filter(
    (other) =>
      other.class === site.class &&
      other.hydrogens === site.hydrogens &&
      Math.abs(other.sigmaStar - site.sigmaStar) < 1e-9,
  ).length;
}

/** Why the constants of a compound's first site are out of reach, or undefined. */
export function outsideReason(compound: Compound, temperatureK: number, options: SpeciateOptions): string | undefined {
  const sites = compound.carbonyl?.sites ?? [];
  const first = sites[0];
  if (!first) return `${compound.name} has no aldehyde or ketone C=O that adds water`;
  const found = hydrationConstant(compound.smiles, first, equivalents(sites, first), {
    temperatureK,
    state: "neutral",
    correlationOnly: options.correlationOnly ?? false,
  });
  return "outside" in found ? found.outside : undefined;
}

/** One entry per site whose constant is known. `dilution`: share of the volume that the solvents have. */
export function siteSharesOf(
  compound: Compound,
  composition: Composition,
  dilution: number,
  temperatureK: number,
  pH: number,
  options: SpeciateOptions,
): readonly SiteShares[] {
  const sites = compound.carbonyl?.sites ?? [];
  const states = chargeStates(compound, pH);
  const lnDilution = Math.log(dilution);
  return sites.flatMap((descriptor) => {
    const perState = states.flatMap(({ state, share }) => {
      const written = inState(descriptor, state);
      const hydration = hydrationConstant(compound.smiles, written, equivalents(sites, descriptor), {
        temperatureK,
        state,
        correlationOnly: options.correlationOnly ?? false,
      });
      if ("outside" in hydration) return [];
      const found = siteRatios(written, hydration, composition, temperatureK, pH);
      const ratios = found.ratios.map((ratio) => (ratio.holds ? { ...ratio, ln: ratio.ln + lnDilution } : ratio));
      return [{ share, hydration, site: { ...found, ratios }, shares: sharesOf(ratios) }];
    });
    const main = [...perState].sort((a, b) => b.share - a.share)[0];
    if (!main) return [];
    const total = perState.reduce((sum, entry) => sum + entry.share, 0);
    const weights = perState.map((entry) => entry.share / total);
    const shares: Shares = {
      free: weighted(
        perState.map((entry) => entry.shares.free),
        weights,
      ),
      forms: main.site.ratios.map((_, i) =>
        weighted(
          perState.map((entry) => entry.shares.forms[i] as Interval),
          weights,
        ),
      ),
    };
    return [{ descriptor, hydration: main.hydration, site: main.site, shares }];
  });
}
