/** From the options of the sites to species of the whole molecule: every combination, with what neighbours do to each other. */

import type { CarbonylSite } from "../../compounds/perception/types.ts";
import { measuredConstant } from "../constants/measured.ts";
import { hydrationEnthalpy, vantHoff } from "../constants/temperature.ts";
import type { SiteOption, SiteOptions } from "./site-options.ts";
import type { Conditions, FormPart, Species } from "./species.ts";

/** A gem-diol beside a C=O draws less than the acyl that it was: σ* of CH(OH)2 against the acyl term of the correlation. */
const NEIGHBOUR = { log10: -0.46, sd: 0.3 };
const MEASURED_NEIGHBOUR_SD = 0.15;
const STANDARD_K = 298.15;
const { LN10 } = Math;

function partOf(option: SiteOption, share: number, whole: string): FormPart {
  const smiles = option.smiles ?? (option.kind === "free carbonyl" ? whole : undefined);
  return { kind: option.kind, label: option.label, smiles, share };
}

/** Species of a site on its own. */
export function speciesOfSite(options: readonly SiteOption[], smiles: string): Species[] {
  return options.map((option) => ({
    units: 1,
    holds: option.ligand === undefined ? [] : [{ ligand: option.ligand, count: 1 }],
    ln: option.ln,
    corrections: option.correction === undefined ? [] : [{ name: option.correction, count: 1 }],
    errors: option.errors,
    parts: [partOf(option, 1, smiles)],
  }));
}

/** True when two sites are directly attached to each other: what one becomes changes the other. */
export function areNeighbours(sites: readonly CarbonylSite[]): boolean {
  return sites.length > 1 && sites.filter((site) => site.acylKinds.includes("oxo")).length > 1;
}

/** What both sites bound costs against each bound alone: from the monohydrate's own constant where it was measured. */
function neighbourEffect(a: SiteOptions, b: SiteOptions, conditions: Conditions): { ln: number; sd: number } {
  const usual = { ln: LN10 * NEIGHBOUR.log10, sd: NEIGHBOUR.sd };
  if (conditions.correlationOnly) return usual;
  const stronger = a.constants.hydration.log10 >= b.constants.hydration.log10 ? a : b;
  const weaker = stronger === a ? b : a;
  const second = measuredConstant(stronger.site.hydrateSmiles, weaker.site.class, "neutral");
  if (!second) return usual;
  const shift = vantHoff(hydrationEnthalpy(weaker.site.class), STANDARD_K, conditions.temperatureK).shift;
  const ka = 10 ** a.constants.hydration.log10;
  const kb = 10 ** b.constants.hydration.log10;
  const both = Math.log(ka + kb) + LN10 * (second.log10 + shift);
  return { ln: both - Math.log(ka * kb), sd: Math.max(MEASURED_NEIGHBOUR_SD, second.sd) };
}

function merged<T extends { readonly count: number }>(rows: readonly T[], name: (row: T) => string): T[] {
  const found = new Map<string, T>();
  for (const row of rows) {
    const before = found.get(name(row));
    found.set(name(row), before ? { ...before, count: before.count + row.count } : row);
  }
  return [...found.values()];
}

function addedErrors(a: Species["errors"], b: Species["errors"]): Record<string, number> {
  const sum: Record<string, number> = { ...a };
  for (const [source, size] of Object.entries(b)) sum[source] = (sum[source] ?? 0) + size;
  return sum;
}

/** Species of a molecule with two sites: all pairs of their options. */
export function speciesOfPair(a: SiteOptions, b: SiteOptions, smiles: string, conditions: Conditions): Species[] {
  const neighbours = areNeighbours([a.site, b.site]) ? neighbourEffect(a, b, conditions) : undefined;
  const species: Species[] = [];
  for (const one of a.options) {
    for (const two of b.options) {
      const both = neighbours && one.kind !== "free carbonyl" && two.kind !== "free carbonyl" ? neighbours : undefined;
      const ligands = [one, two].flatMap(({ ligand }) => (ligand === undefined ? [] : [{ ligand, count: 1 }]));
      const corrections = [one, two].flatMap(({ correction: name }) =>
        name === undefined ? [] : [{ name, count: 1 }],
      );
      const errors = addedErrors(one.errors, two.errors);
      species.push({
        units: 1,
        holds: merged(ligands, (row) => row.ligand),
        ln: one.ln + two.ln + (both?.ln ?? 0),
        corrections: merged(corrections, (row) => row.name),
        errors: both ? { ...errors, neighbours: both.sd } : errors,
        parts: [partOf(one, 0.5, smiles), partOf(two, 0.5, smiles)],
      });
    }
  }
  return species;
}
