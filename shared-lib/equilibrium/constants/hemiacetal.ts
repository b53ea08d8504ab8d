/**
 * K_j = [hemiacetal]/[C=O] of one site in the neat alcohol j: measured for the pair, else from the linear relation between hemiacetal
 * and hydrate constants (their ratio is nearly constant along a series: Guthrie, Can. J. Chem. 1975, 53, 898), with a term for each alcohol.
 */

import type { CarbonylSite } from "../../compounds/perception/types.ts";
import { measuredHemiacetal } from "../../constants/hemiacetals.ts";
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

/** Two groups meet the larger nucleophile at a ketone: a judgement between no effect (acetone and cyclohexanone in methanol, recalled) and a tenfold one. */
const KETONE = { by: -0.3, sd: 0.4 };
const STANDARD_K = 298.15;

const shown = (log10: number): string => log10.toFixed(2).replace("-", "−");

/** Alcohols that the table holds, by key of the solvents table. */
export function knownAlcohols(): readonly string[] {
  return Object.keys(TERMS);
}

function fromMeasured(site: CarbonylSite, alcohol: string, temperatureK: number): ConstantEstimate | undefined {
  const found = site.leading ? measuredHemiacetal(site.parent, alcohol) : undefined;
  if (!found) return undefined;
  const change = vantHoff(hemiacetalEnthalpy(site.class, site.parent), STANDARD_K, temperatureK);
  const log10 = found.log10 + change.shift;
  const sd = Math.hypot(found.sd, change.sd);
  const source = found.rows[0]?.source ?? "";
  const says = `Hemiacetal constant measured with ${alcohol} (${found.rows.length} value${found.rows.length > 1 ? "s" : ""}), in the neat alcohol`;
  return {
    log10,
    sd,
    method: "measured",
    source,
    lines: [{ says, value: `log K = ${shown(log10)} ± ${sd.toFixed(2)}`, source }],
  };
}

function fromHydration(
  site: CarbonylSite,
  hydration: ConstantEstimate,
  alcohol: string,
  term: AlcoholTerm,
  temperatureK: number,
): ConstantEstimate {
  const own = vantHoff(hemiacetalEnthalpy(site.class, site.parent), STANDARD_K, temperatureK);
  const shared = vantHoff(hydrationEnthalpy(site.class, site.parent), STANDARD_K, temperatureK);
  const ketone = site.hydrogens === 0 ? KETONE : { by: 0, sd: 0 };
  const ratio = term.log10 + ketone.by;
  const log10 = hydration.log10 + ratio + (own.shift - shared.shift);
  const sd = Math.hypot(hydration.sd, term.sd, ketone.sd, own.sd - shared.sd);
  const says = `Hemiacetal in neat ${alcohol}: hydration constant × 10^${shown(ratio)} (the alcohol's term${ketone.by ? ", less for a ketone" : ""})`;
  const value = `log K = ${shown(log10)} ± ${sd.toFixed(2)}`;
  return { log10, sd, method: "correlated", source: term.source, lines: [{ says, value, source: term.source }] };
}

/**
 * Hemiacetal constant of a site in a neat alcohol at the temperature of `hydration`.
 *
 * @param hydration the site's hydration constant at that temperature
 * @param correlationOnly leaves measured hemiacetal constants out
 * @returns undefined for an alcohol that the table does not hold
 */
export function hemiacetalConstant(
  site: CarbonylSite,
  hydration: ConstantEstimate,
  alcohol: string,
  temperatureK: number,
  correlationOnly = hydration.method === "correlated",
): ConstantEstimate | undefined {
  const term = TERMS[alcohol];
  if (!term) return undefined;
  const measured = correlationOnly ? undefined : fromMeasured(site, alcohol, temperatureK);
  return measured ?? fromHydration(site, hydration, alcohol, term, temperatureK);
}
