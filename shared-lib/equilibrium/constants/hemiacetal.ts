/**
 * K_j = [hemiacetal]/[C=O] of one site in the neat alcohol j: from the linear relation between hemiacetal and hydrate constants
 * (their ratio is nearly constant along a series: Guthrie, Can. J. Chem. 1975, 53, 898), with a term for each alcohol.
 */

import type { CarbonylSite } from "../../compounds/perception/types.ts";
import terms from "../../generated/alcohol-terms.json" with { type: "json" };
import { hemiacetalEnthalpy, hydrationEnthalpy, vantHoff } from "./temperature.ts";
import type { ConstantEstimate } from "./types.ts";

interface AlcoholTerm {
  /** log10 of K_j (neat alcohol) over K_h (water), at 25 °C. */
  readonly log10: number;
  readonly sd: number;
  readonly source: string;
}
const TERMS: Readonly<Record<string, AlcoholTerm>> = terms;

/** Ketones bind alcohols less well against water than aldehydes do: two groups meet the larger nucleophile. Judgement, error 0.4. */
const KETONE = { by: -0.7, sd: 0.4 };

/** Alcohols that the table holds, by key of the solvents table. */
export function knownAlcohols(): readonly string[] {
  return Object.keys(TERMS);
}

/**
 * Hemiacetal constant of a site in a neat alcohol at the temperature of `hydration`.
 *
 * @param hydration the site's hydration constant at that temperature
 * @returns undefined for an alcohol that the table does not hold
 */
export function hemiacetalConstant(
  site: CarbonylSite,
  hydration: ConstantEstimate,
  alcohol: string,
  temperatureK: number,
): ConstantEstimate | undefined {
  const term = TERMS[alcohol];
  if (!term) return undefined;
  const own = vantHoff(hemiacetalEnthalpy(site.class), 298.15, temperatureK);
  const shared = vantHoff(hydrationEnthalpy(site.class), 298.15, temperatureK);
  const ketone = site.hydrogens === 0 ? KETONE : { by: 0, sd: 0 };
  const log10 = hydration.log10 + term.log10 + ketone.by + (own.shift - shared.shift);
  const sd = Math.hypot(hydration.sd, term.sd, ketone.sd, own.sd - shared.sd);
  return {
    log10,
    sd,
    method: "correlated",
    source: term.source,
    lines: [
      {
        says: `Hemiacetal in neat ${alcohol}: hydration constant × 10^${(term.log10 + ketone.by).toFixed(2)} (the alcohol's term${ketone.by ? ", less for a ketone" : ""})`,
        value: `log K = ${log10.toFixed(2).replace("-", "−")} ± ${sd.toFixed(2)}`,
        source: term.source,
      },
    ],
  };
}
