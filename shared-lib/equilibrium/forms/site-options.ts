/** What one site can become — open, hydrate, its anion, hemiacetals, a ring — in each charge state of the molecule. */

import type { CarbonylSite } from "../../compounds/perception/types.ts";
import type { Compound } from "../../compounds/types.ts";
import type { DerivationLine, FormKind } from "../../model/contract.ts";
import { adductConstant, readyShare } from "../adducts/adducts.ts";
import { openStateRatio, siteAcidity } from "../charge-state.ts";
import { hemiacetalConstant } from "../constants/hemiacetal.ts";
import { hydrationConstant } from "../constants/hydration.ts";
import type { ChargeState, ConstantEstimate, NoConstant } from "../constants/types.ts";
import { diolAcidity } from "../diol-acidity.ts";
import { ringClosure } from "../ring-closure.ts";
import { type Conditions, type ErrorSources, type MediumCorrection, type SiteConstants, WATER } from "./species.ts";

/** One form of a site, as its ratio to the open uncharged site. */
export interface SiteOption {
  readonly kind: FormKind;
  readonly label: string;
  readonly smiles?: string;
  readonly ln: number;
  readonly errors: ErrorSources;
  readonly ligand?: string;
  readonly correction?: MediumCorrection;
}

export interface SiteOptions {
  readonly site: CarbonylSite;
  /** The first one is the open uncharged site, with ln 0. */
  readonly options: readonly SiteOption[];
  readonly constants: SiteConstants;
  readonly lines: readonly DerivationLine[];
}

const { LN10 } = Math;
/** Σσ⁺ below which the ring carries an amine. */
const MOST_DONATING = -1;

export const OPEN: SiteOption = { kind: "free carbonyl", label: "free carbonyl", ln: 0, errors: {} };

function alike(a: CarbonylSite, b: CarbonylSite): boolean {
  return a.class === b.class && a.hydrogens === b.hydrogens && Math.abs(a.sigmaStar - b.sigmaStar) < 1e-9;
}

/** Hydration constant of one site; a constant published for the molecule counts all the sites that are alike. */
export function siteHydration(
  compound: Compound,
  site: CarbonylSite,
  state: ChargeState,
  conditions: Conditions,
): ConstantEstimate | NoConstant {
  const same = (compound.carbonyl?.sites ?? []).filter((other) => alike(other, site));
  const leading = same.some((other) => other.leading);
  return hydrationConstant(
    compound.smiles,
    leading === site.leading ? site : { ...site, leading },
    Math.max(1, same.length),
    {
      temperatureK: conditions.temperatureK,
      state,
      correlationOnly: conditions.correlationOnly,
    },
  );
}

/** Perception of the site with its acid as carboxylate. */
function inState(site: CarbonylSite, state: ChargeState): CarbonylSite {
  return state === "anion" && site.acylKinds.includes("acid") ? { ...site, carboxylate: true } : site;
}

/** Diols that DMSO holds: of aryl trifluoromethyl ketones without N–H, and of 2-nitrobenzaldehyde (media README). */
function hasAcidicDiol(site: CarbonylSite): boolean {
  if (!site.aryl) return false;
  if (site.class === "trifluoromethyl ketone") return site.aryl.sigmaPlus > MOST_DONATING;
  return site.class === "aryl aldehyde" && site.aryl.ortho.includes("NO2");
}

function diolCorrection(site: CarbonylSite): MediumCorrection {
  if (site.class === "alpha-keto acid") return "diol of a keto acid";
  return hasAcidicDiol(site) ? "acidic diol" : "diol";
}

function hydrates(
  site: CarbonylSite,
  key: string,
  hydration: ConstantEstimate,
  before: SiteOption,
  conditions: Conditions,
): SiteOption[] {
  if (!conditions.water) return [];
  const ln = before.ln + LN10 * hydration.log10;
  const errors = { ...before.errors, [`hydration ${key}`]: hydration.sd };
  const acidity = diolAcidity(site);
  const shared = { ligand: WATER, correction: diolCorrection(site) };
  return [
    { kind: "hydrate", label: "gem-diol hydrate", smiles: site.hydrateSmiles, ln, errors, ...shared },
    {
      kind: "hydrate anion",
      label: "anion of the hydrate",
      ln: ln + LN10 * (conditions.pH - acidity.pKa),
      errors: { ...errors, [`diol acidity ${key}`]: acidity.sd },
      ...shared,
    },
  ];
}

/** @param unmeasured do not read measured hemiacetal constants: they are those of the uncharged molecule */
function hemiacetals(
  site: CarbonylSite,
  key: string,
  hydration: ConstantEstimate,
  before: SiteOption,
  conditions: Conditions,
  unmeasured: boolean,
) {
  const options: SiteOption[] = [];
  const alcohols: { name: string; constant: ConstantEstimate }[] = [];
  for (const alcohol of conditions.alcohols) {
    const constant = hemiacetalConstant(site, hydration, alcohol, conditions.temperatureK, unmeasured);
    if (!constant) continue;
    alcohols.push({ name: alcohol, constant });
    // The hydration constant's error is shared with the hydrate; what the alcohol adds is its own.
    const own = Math.sqrt(Math.max(0, constant.sd ** 2 - hydration.sd ** 2));
    options.push({
      kind: "hemiacetal",
      label: `${alcohol} hemiacetal`,
      ln: before.ln + LN10 * constant.log10,
      errors: {
        ...before.errors,
        [`hydration ${key}`]: Math.min(hydration.sd, constant.sd),
        [`term of ${alcohol}`]: own,
      },
      ligand: alcohol,
      correction: `alcohol:${alcohol}`,
    });
  }
  return { options, alcohols };
}

/** The charged open molecule beside the uncharged one, as the reference of its own hydrate. */
function chargedReference(
  compound: Compound,
  site: CarbonylSite,
  uncharged: ConstantEstimate,
  conditions: Conditions,
): { readonly state: ChargeState; readonly option: SiteOption; readonly hydration: ConstantEstimate } | undefined {
  const acidity = siteAcidity(compound, site);
  if (!acidity) return undefined;
  const hydration = siteHydration(compound, inState(site, acidity.state), acidity.state, conditions);
  if ("outside" in hydration) return undefined;
  const ratio = openStateRatio(acidity, conditions.pH, {
    uncharged: 1 + 10 ** uncharged.log10,
    charged: 1 + 10 ** hydration.log10,
  });
  const option: SiteOption = { ...OPEN, ln: ratio.ln, errors: { [`acidity ${site.atom}`]: ratio.sd } };
  return { state: acidity.state, option, hydration };
}

function adducts(site: CarbonylSite, key: string, hydration: ConstantEstimate, conditions: Conditions) {
  const options: SiteOption[] = [];
  const lines: DerivationLine[] = [];
  for (const { compound, kind } of conditions.partners) {
    const constant = adductConstant(site, hydration.log10, kind, compound, conditions.temperatureK);
    if (!constant) continue;
    const ready = readyShare(kind, compound, conditions.pH);
    if (!(ready > 0)) continue;
    options.push({
      kind: kind.kind,
      label: `${site.class === "formaldehyde" && kind.adduct === "imine" ? "hydroxymethylamine" : kind.adduct} with ${compound.name}`,
      ln: LN10 * constant.log10 + Math.log(ready),
      errors: { [`adduct ${key} ${compound.id}`]: constant.sd },
      ligand: `with:${compound.id}`,
      ...(kind.releasesWater && site.class !== "formaldehyde" ? { correction: "condensed" as const } : {}),
    });
    lines.push(constant.line);
  }
  return { options, lines };
}

/** Options of a site, or why its constant is out of reach. */
export function siteOptions(compound: Compound, site: CarbonylSite, conditions: Conditions): SiteOptions | NoConstant {
  const hydration = siteHydration(compound, site, "neutral", conditions);
  if ("outside" in hydration) return hydration;
  // Sites that are alike share their constant, and so its error.
  const key = String((compound.carbonyl?.sites.find((other) => alike(other, site)) ?? site).atom);
  const options: SiteOption[] = [OPEN, ...hydrates(site, key, hydration, OPEN, conditions)];
  const ethers = hemiacetals(site, key, hydration, OPEN, conditions, conditions.correlationOnly);
  options.push(...ethers.options);
  const lines: DerivationLine[] = [];
  const charged = chargedReference(compound, site, hydration, conditions);
  if (charged) {
    const written = inState(site, charged.state);
    const own = `${key} ${charged.state}`;
    const more = hemiacetals(written, own, charged.hydration, charged.option, conditions, true);
    options.push(charged.option, ...hydrates(written, own, charged.hydration, charged.option, conditions));
    options.push(...more.options);
    const shown = (constant: ConstantEstimate): string => constant.log10.toFixed(2).replace("-", "−");
    lines.push({
      says: `At pH ${conditions.pH.toFixed(1)} the ${charged.option.ln > 0 ? charged.state : "uncharged form"} dominates; each state counts with its own constant`,
      value: `log K ${shown(hydration)} uncharged, ${shown(charged.hydration)} ${charged.state}`,
    });
  }
  const ring = ringClosure(site, compound.smiles, conditions.temperatureK, conditions.correlationOnly);
  if (ring) {
    options.push({
      kind: "cyclic hemiacetal",
      label: ring.label,
      ...(site.closure ? { smiles: site.closure.smiles } : {}),
      ln: LN10 * ring.log10,
      errors: { [`ring ${key}`]: ring.sd },
    });
    lines.push(ring.line);
  }
  const others = adducts(site, key, hydration, conditions);
  options.push(...others.options);
  lines.push(...others.lines);
  const lead = { says: `${site.class}${hydration.method === "measured" ? ", measured for this compound" : ""}` };
  return {
    site,
    options,
    constants: { site, hydration, alcohols: ethers.alcohols },
    lines: [lead, ...hydration.lines, ...lines, ...ethers.alcohols.flatMap(({ constant }) => constant.lines)],
  };
}
