/** Everything that a carbonyl compound can become under given conditions; what was worked out last is kept. */

import type { Compound } from "../../compounds/types.ts";
import type { NoConstant } from "../constants/types.ts";
import { formaldehydeSpecies, isFormaldehyde } from "./formaldehyde.ts";
import { areNeighbours, speciesOfPair, speciesOfSite } from "./molecule.ts";
import { aldehydeChains, hasOligomers, tabledOligomers } from "./oligomers.ts";
import { type SiteOptions, siteOptions } from "./site-options.ts";
import type { CompoundForms, Conditions, SpeciesSet } from "./species.ts";

/** A site beside a stronger one that is hydrated feels a diol in place of an acyl. */
const BESIDE_DIOL = -0.46 * Math.LN10;
const CHAIN_CLASSES = new Set(["aliphatic aldehyde", "alpha-hetero aldehyde"]);

function besideDiol(options: SiteOptions): SiteOptions {
  const lowered = options.options.map((option) =>
    option.ligand === undefined ? option : { ...option, ln: option.ln + BESIDE_DIOL },
  );
  return { ...options, options: lowered };
}

function independentSets(compound: Compound, all: readonly SiteOptions[]): SpeciesSet[] {
  const neighbours = areNeighbours(all.map((one) => one.site));
  return all.map((one) => {
    const lowered = neighbours && !one.site.leading && one.site.acylKinds.includes("oxo") ? besideDiol(one) : one;
    return { species: speciesOfSite(lowered.options, compound.smiles) };
  });
}

function build(compound: Compound, conditions: Conditions): CompoundForms | NoConstant {
  const sites = compound.carbonyl?.sites ?? [];
  const first = sites[0];
  if (!first) return { outside: `${compound.name} has no aldehyde or ketone C=O that adds water` };
  const answered = sites.map((site) => siteOptions(compound, site, conditions));
  const all = answered.filter((one): one is SiteOptions => !("outside" in one));
  const refusal = answered.find((one): one is NoConstant => "outside" in one);
  if (all.length === 0) return refusal ?? { outside: "no constant is known for it" };
  const main = all[0] as SiteOptions;
  const lines = all.flatMap((one, i) =>
    all.length > 1
      ? one.lines.map((line, k) => (k === 0 ? { ...line, says: `Site ${i + 1}: ${line.says}` } : line))
      : one.lines,
  );
  const shared = {
    sites: all.map((one) => one.constants),
    cautions: refusal ? [`One site is left out: ${refusal.outside}.`] : [],
  };
  if (isFormaldehyde(first)) {
    const found = formaldehydeSpecies(main, compound.smiles, conditions);
    return { ...shared, sets: [{ species: found.species }], lines: [...lines, ...found.lines] };
  }
  const parent = first.parent;
  const together = all.length === 1 || (all.length === 2 && (hasOligomers(parent) || areNeighbours(sites)));
  if (!together) return { ...shared, sets: independentSets(compound, all), lines };
  const monomers =
    all.length === 1
      ? speciesOfSite(main.options, compound.smiles)
      : speciesOfPair(main, all[1] as SiteOptions, compound.smiles, conditions);
  const tabled = tabledOligomers(parent, monomers, conditions);
  const chains =
    conditions.concentrated &&
    all.length === 1 &&
    tabled.species.length === 0 &&
    CHAIN_CLASSES.has(first.class) &&
    !first.closure
      ? aldehydeChains(monomers, Math.LN10 * main.constants.hydration.log10, conditions.temperatureK)
      : { species: [], lines: [] };
  return {
    ...shared,
    sets: [{ species: [...monomers, ...tabled.species, ...chains.species] }],
    lines: [...lines, ...tabled.lines, ...chains.lines],
  };
}

const KEPT = 6;
const cache = new WeakMap<Compound, { readonly key: string; readonly forms: CompoundForms | NoConstant }[]>();

function keyOf(conditions: Conditions): string {
  const partners = conditions.partners.map(({ compound }) => compound.id).join();
  return `${conditions.temperatureK}|${conditions.pH}|${conditions.correlationOnly}|${conditions.water}|${conditions.concentrated}|${conditions.alcohols.join()}|${partners}`;
}

/** Species, constants and reasons of a compound, or why there are none. */
export function compoundForms(compound: Compound, conditions: Conditions): CompoundForms | NoConstant {
  const key = keyOf(conditions);
  const kept = cache.get(compound);
  const found = kept?.find((entry) => entry.key === key);
  if (found) return found.forms;
  const forms = build(compound, conditions);
  if (!kept) cache.set(compound, [{ key, forms }]);
  else {
    if (kept.length >= KEPT) kept.shift();
    kept.push({ key, forms });
  }
  return forms;
}
