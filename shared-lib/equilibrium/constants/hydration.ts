/** K_h = [gem-diol]/[C=O] of one site in dilute water: measured for the compound, else correlated, else outside. */

import type { CarbonylSite } from "../../compounds/perception/types.ts";
import type { ReactionEnthalpy } from "../../constants/enthalpies.ts";
import type { DerivationLine } from "../../model/contract.ts";
import { correlate } from "./correlate.ts";
import { citationOf, type MeasuredConstant, measuredConstant } from "./measured.ts";
import { hydrationEnthalpy, vantHoff } from "./temperature.ts";
import type { ChargeState, ConstantEstimate, ConstantQuery, NoConstant } from "./types.ts";

const STANDARD_K = 298.15;
/** No hover lists more than this many published values. */
const MOST_SHOWN = 4;

/** log10 with a true minus sign and two decimals. */
function shown(log10: number): string {
  return log10.toFixed(2).replace("-", "−");
}

function celsius(value: number): string {
  return `${Number(value.toFixed(1))}`.replace("-", "−");
}

/** The values in use, one a source, then their mean, then what was set aside. */
function measuredLines(found: MeasuredConstant): DerivationLine[] {
  const used = found.values.filter((value) => value.use);
  const first = used.filter((value, i) => used.findIndex((other) => other.source === value.source) === i);
  const lines: DerivationLine[] = first.slice(0, MOST_SHOWN).map((value) => ({
    says: `Hydration constant measured in water at ${celsius(value.celsius)} °C`,
    value: `log K = ${shown(value.log10)}`,
    source: citationOf(value),
  }));
  if (used.length > 1)
    lines.push({
      says: `Mean at 25 °C of ${found.sources} sources (${used.length} values), weighted by how each was read`,
      value: `log K = ${shown(found.log10)} ± ${found.sd.toFixed(2)}`,
    });
  const apart = found.values.filter((value) => !value.use && !value.limit);
  if (apart.length > 0)
    lines.push({
      says: `${apart.length} published value(s) set aside as doubtful or measured in another state`,
      value: apart.map((value) => shown(value.log10)).join(", "),
    });
  return lines;
}

/** What was measured for the compound; it speaks of the site that takes the water first. */
function measuredAt(site: CarbonylSite, state: ChargeState): MeasuredConstant | undefined {
  if (!site.leading) return undefined;
  const written = site.carboxylate ? "anion" : site.cation ? "cation" : "neutral";
  return measuredConstant(site.parent, site.class, state === "neutral" ? written : state);
}

interface At25 {
  readonly log10: number;
  readonly sd: number;
  readonly source: string;
  readonly lines: readonly DerivationLine[];
}

function fromMeasured(found: MeasuredConstant, equivalentSites: number): At25 {
  const best = found.values.find((value) => value.use);
  const lines = measuredLines(found);
  if (equivalentSites > 1)
    lines.push({
      says: `The published constant counts ${equivalentSites} like C=O; for each of them`,
      value: `log K = ${shown(found.log10 - Math.log10(equivalentSites))}`,
    });
  return {
    log10: found.log10 - Math.log10(equivalentSites),
    sd: found.sd,
    source: best ? citationOf(best) : "table",
    lines,
  };
}

function fromCorrelation(site: CarbonylSite, state: ChargeState): At25 | NoConstant {
  const found = correlate(site, state);
  if ("outside" in found) return found;
  const says = `Not measured for this compound: ${found.says}`;
  const value = `log K = ${shown(found.log10)} ± ${found.sd.toFixed(2)}`;
  return { log10: found.log10, sd: found.sd, source: found.name, lines: [{ says, value, source: found.name }] };
}

function temperatureLine(enthalpy: ReactionEnthalpy, temperatureK: number, log10: number): DerivationLine {
  return {
    says: `van 't Hoff from 25 to ${celsius(temperatureK - 273.15)} °C with ΔH° = ${shown(enthalpy.value)} ± ${enthalpy.sd.toFixed(1)} kJ/mol`,
    value: `log K = ${shown(log10)}`,
    source: enthalpy.source,
  };
}

/**
 * Hydration constant of a site at the temperature asked for.
 *
 * @param _canonicalSmiles of the whole compound; the site knows the parent that constants are filed under
 * @param equivalentSites how many sites of the molecule are like this one: a published constant counts them all
 */
export function hydrationConstant(
  _canonicalSmiles: string,
  site: CarbonylSite,
  equivalentSites: number,
  query: ConstantQuery,
): ConstantEstimate | NoConstant {
  const measured = query.correlationOnly ? undefined : measuredAt(site, query.state);
  const found = measured ? fromMeasured(measured, equivalentSites) : fromCorrelation(site, query.state);
  if ("outside" in found) return found;
  const enthalpy = hydrationEnthalpy(site.class, site.parent);
  const change = vantHoff(enthalpy, STANDARD_K, query.temperatureK);
  const log10 = found.log10 + change.shift;
  const warm = Math.abs(query.temperatureK - STANDARD_K) > 0.5;
  return {
    log10,
    sd: Math.hypot(found.sd, change.sd),
    method: measured ? "measured" : "correlated",
    source: found.source,
    lines: warm ? [...found.lines, temperatureLine(enthalpy, query.temperatureK, log10)] : found.lines,
  };
}
