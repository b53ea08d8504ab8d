/** K_h = [gem-diol]/[C=O] of one site in dilute water: measured for the compound, else correlated, else outside. */

import type { CarbonylSite } from "../../compounds/perception/types.ts";
import type { DerivationLine } from "../../model/contract.ts";
import { correlate } from "./correlate.ts";
import { citationOf, type MeasuredConstant, measuredConstant } from "./measured.ts";
import { hydrationEnthalpy, vantHoff } from "./temperature.ts";
import type { ChargeState, ConstantEstimate, ConstantQuery, NoConstant } from "./types.ts";

const STANDARD_K = 298.15;

/** log10 with a true minus sign and two decimals. */
function shown(log10: number): string {
  return log10.toFixed(2).replace("-", "−");
}

function measuredLines(found: MeasuredConstant): DerivationLine[] {
  const used = found.values.filter((value) => value.use);
  const apart = found.values.filter((value) => !value.use);
  const lines: DerivationLine[] = used.slice(0, 3).map((value) => ({
    says: `Hydration constant measured in water at ${value.celsius} °C`,
    value: `log K = ${shown(value.log10)}`,
    source: citationOf(value),
  }));
  if (used.length > 1)
    lines.push({
      says: `Mean of ${used.length} published values, weighted by how the number was read`,
      value: `log K = ${shown(found.log10)} ± ${found.sd.toFixed(2)}`,
    });
  if (apart.length > 0)
    lines.push({
      says: `${apart.length} published value(s) set aside as doubtful or measured in another state`,
      value: apart.map((value) => shown(value.log10)).join(", "),
    });
  return lines;
}

/** What was measured for the compound as written, else for its uncharged parent; it speaks of the site that takes the water first. */
function measuredAt(canonicalSmiles: string, site: CarbonylSite, state: ChargeState): MeasuredConstant | undefined {
  if (!site.leading) return undefined;
  const written = site.carboxylate ? "anion" : site.cation ? "cation" : "neutral";
  const own = state === "neutral" ? written : state;
  return measuredConstant(canonicalSmiles, own) ?? measuredConstant(site.parent, own);
}

/**
 * Hydration constant of a site at the temperature asked for.
 *
 * @param canonicalSmiles of the whole compound, as the structure toolkit writes it
 * @param equivalentSites how many sites of the molecule are like this one: a published constant counts them all
 */
export function hydrationConstant(
  canonicalSmiles: string,
  site: CarbonylSite,
  equivalentSites: number,
  query: ConstantQuery,
): ConstantEstimate | NoConstant {
  const enthalpy = hydrationEnthalpy(site.class);
  const measured = query.correlationOnly ? undefined : measuredAt(canonicalSmiles, site, query.state);
  const lines: DerivationLine[] = [];
  let log10: number;
  let sd: number;
  let fromK = STANDARD_K;
  let source: string;
  if (measured) {
    log10 = measured.log10 - Math.log10(equivalentSites);
    sd = measured.sd;
    fromK = measured.celsius + 273.15;
    lines.push(...measuredLines(measured));
    const best = measured.values.find((value) => value.use);
    source = best ? citationOf(best) : "table";
  } else {
    const found = correlate(site, query.state);
    if ("outside" in found) return found;
    ({ log10, sd } = found);
    source = found.name;
    lines.push({
      says: `Not measured for this compound: ${found.says}`,
      value: `log K = ${shown(log10)} ± ${sd.toFixed(2)}`,
      source: found.name,
    });
  }
  const change = vantHoff(enthalpy, fromK, query.temperatureK);
  if (Math.abs(query.temperatureK - fromK) > 0.5)
    lines.push({
      says: `van 't Hoff from ${(fromK - 273.15).toFixed(0)} to ${(query.temperatureK - 273.15).toFixed(0)} °C with ΔH° = ${shown(enthalpy.value)} ± ${enthalpy.sd} kJ/mol`,
      value: `log K = ${shown(log10 + change.shift)}`,
      source: enthalpy.source,
    });
  return {
    log10: log10 + change.shift,
    sd: Math.hypot(sd, change.sd),
    method: measured ? "measured" : "correlated",
    source,
    lines,
  };
}
