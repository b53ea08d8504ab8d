/** Every form that one site can take in the vessel, as its ratio to the free C=O, with the errors that the ratios share. */

import type { CarbonylSite } from "../compounds/perception/types.ts";
import type { Composition } from "../media/composition.ts";
import { hemiacetalFactor, hydrationFactor } from "../media/medium-factor.ts";
import type { DerivationLine, FormKind } from "../model/contract.ts";
import { hemiacetalConstant } from "./constants/hemiacetal.ts";
import type { ConstantEstimate } from "./constants/types.ts";
import { diolAcidity } from "./diol-acidity.ts";
import { ringClosure } from "./ring-closure.ts";

/** What a ratio's log10 gains per standard deviation of each independent source of error, by the name of the source. */
export type ErrorSources = Readonly<Record<string, number>>;

export interface FormRatio {
  readonly kind: FormKind;
  readonly label: string;
  readonly smiles?: string;
  /** ln of [form]/[free C=O]. */
  readonly ln: number;
  readonly errors: ErrorSources;
  /** The solvent whose molecule the form holds, by key of the solvents table. */
  readonly holds?: string;
}

export interface SiteRatios {
  readonly ratios: readonly FormRatio[];
  readonly alcohols: readonly { readonly name: string; readonly constant: ConstantEstimate }[];
  readonly lines: readonly DerivationLine[];
}

const LN10 = Math.LN10;

/** Water and the waters of deuteration count as one nucleophile. */
function waterKey(composition: Composition): string | undefined {
  return composition.components.find((component) => component.solvent.nucleophile === "water")?.solvent.key;
}

function hydrateForms(
  site: CarbonylSite,
  hydration: ConstantEstimate,
  composition: Composition,
  temperatureK: number,
  pH: number,
) {
  const forms: FormRatio[] = [];
  const acidicDiol = site.class === "trifluoromethyl ketone" && site.aryl !== undefined;
  const factor = hydrationFactor(composition, temperatureK, { ketoAcid: site.class === "alpha-keto acid", acidicDiol });
  const holds = waterKey(composition);
  if (holds === undefined || !Number.isFinite(factor.log10)) return { forms, lines: factor.lines };
  const ln = LN10 * (hydration.log10 + factor.log10);
  const errors = { hydration: hydration.sd, water: factor.sd };
  forms.push({ kind: "hydrate", label: "gem-diol hydrate", smiles: site.hydrateSmiles, ln, errors, holds });
  const acidity = diolAcidity(site);
  const lnAnion = ln + LN10 * (pH - acidity.pKa);
  forms.push({
    kind: "hydrate anion",
    label: "anion of the hydrate",
    ln: lnAnion,
    errors: { ...errors, acidity: acidity.sd },
    holds,
  });
  return { forms, lines: factor.lines };
}

/**
 * Ratios of every form of a site to its free C=O.
 *
 * @param hydration the site's hydration constant at the temperature
 * @param composition the solvents that are free at the moment
 */
export function siteRatios(
  site: CarbonylSite,
  hydration: ConstantEstimate,
  composition: Composition,
  temperatureK: number,
  pH: number,
): SiteRatios {
  const water = hydrateForms(site, hydration, composition, temperatureK, pH);
  const ratios: FormRatio[] = [...water.forms];
  const lines: DerivationLine[] = [...water.lines];
  const alcohols: { name: string; constant: ConstantEstimate }[] = [];
  for (const { solvent } of composition.components) {
    if (solvent.nucleophile !== "alcohol") continue;
    const constant = hemiacetalConstant(site, hydration, solvent.key, temperatureK);
    if (!constant) continue;
    const factor = hemiacetalFactor(composition, solvent.key);
    alcohols.push({ name: solvent.key, constant });
    lines.push(...constant.lines, ...factor.lines);
    const own = Math.sqrt(Math.max(0, constant.sd ** 2 - hydration.sd ** 2));
    ratios.push({
      kind: "hemiacetal",
      label: `${solvent.key} hemiacetal`,
      ln: LN10 * (constant.log10 + factor.log10),
      errors: { hydration: hydration.sd, [`alcohol ${solvent.key}`]: own, [`share of ${solvent.key}`]: factor.sd },
      holds: solvent.key,
    });
  }
  const ring = ringClosure(site);
  if (ring) {
    ratios.push({
      kind: "cyclic hemiacetal",
      label: ring.label,
      smiles: site.closure?.smiles,
      ln: LN10 * ring.log10,
      errors: { ring: ring.sd },
    });
    lines.push(ring.line);
  }
  return { ratios, alcohols, lines };
}
