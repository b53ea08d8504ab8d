/** Formaldehyde in water, with or without methanol, as reported forms. */

import type { FormShare, Interval } from "../model/contract.ts";
import { hemiacetalConstant, knownAlcohols } from "./constants/hemiacetal.ts";
import { hydrationConstant } from "./constants/hydration.ts";
import { formaldehydeForms } from "./formaldehyde.ts";
import { approachTime } from "./time-to-equilibrium.ts";
import type { CarbonylForms, Contents, SpeciateOptions } from "./types.ts";

const Z95 = 1.959964;
/** Errors on the logit: chain constants hold to about a tenth of a unit between sources; hemiformal chains rest on equal reactivity. */
const LOGIT_SD = { glycol: 0.2, longerGlycols: 0.25, hemiformal: 0.3, longerHemiformals: 0.4 };
/** Amount against the solvent that stands for "infinitely dilute". */
const TRACE = 1e-9;

function bounded(share: number, sd: number): Interval {
  if (share <= 0) return { value: 0, low: 0, high: 0 };
  if (share >= 1) return { value: 1, low: 1, high: 1 };
  const logit = Math.log(share / (1 - share));
  const at = (x: number): number => 1 / (1 + Math.exp(-x));
  return { value: share, low: at(logit - Z95 * sd), high: at(logit + Z95 * sd) };
}

/** undefined unless the compound is formaldehyde and only water and methanol can add to it. */
export function chainForms(
  row: Contents["carbonyls"][number],
  contents: Contents,
  pH: number,
  options: SpeciateOptions,
): CarbonylForms | undefined {
  const site = row.compound.carbonyl?.sites[0];
  if (site?.class !== "formaldehyde") return undefined;
  const amountOf = (key: string): number =>
    contents.solvents.reduce((sum, part) => sum + (part.solvent === key ? Math.max(0, part.amount) : 0), 0);
  const water = amountOf("water");
  const methanol = amountOf("methanol");
  const others = contents.solvents.some(
    (part) => part.amount > 0 && part.solvent !== "methanol" && knownAlcohols().includes(part.solvent),
  );
  if (!(water > 0) || others) return undefined;
  const hydration = hydrationConstant(row.compound.smiles, site, 1, {
    temperatureK: contents.temperatureK,
    state: "neutral",
    correlationOnly: options.correlationOnly ?? false,
  });
  if ("outside" in hydration) return undefined;
  const amount = row.amount > 0 ? row.amount : TRACE * water;
  const found = formaldehydeForms(amount, water, methanol, contents.temperatureK);
  if (!found) return undefined;
  const glycol = found.glycol / amount;
  const freeOverGlycol = 10 ** -hydration.log10 / found.waterFraction;
  const free = glycol * freeOverGlycol;
  const rest = 1 / (1 + free);
  const share = (mol: number): number => (mol / amount) * rest;
  const forms: FormShare[] = [
    {
      kind: "free carbonyl",
      label: "free formaldehyde",
      smiles: "C=O",
      fraction: bounded(free * rest, Math.hypot(hydration.sd * Math.LN10, LOGIT_SD.glycol)),
    },
    { kind: "hydrate", label: "methanediol", smiles: "OCO", fraction: bounded(share(found.glycol), LOGIT_SD.glycol) },
  ];
  if (found.longerGlycols > TRACE * amount)
    forms.push({
      kind: "oligomer",
      label: "poly(oxymethylene) glycols, n ≥ 2",
      smiles: "OCOCO",
      fraction: bounded(share(found.longerGlycols), LOGIT_SD.longerGlycols),
    });
  if (found.hemiformal > TRACE * amount)
    forms.push({
      kind: "hemiacetal",
      label: "methoxymethanol",
      smiles: "COCO",
      fraction: bounded(share(found.hemiformal), LOGIT_SD.hemiformal),
    });
  if (found.longerHemiformals > TRACE * amount)
    forms.push({
      kind: "oligomer",
      label: "longer hemiformals",
      smiles: "COCOCO",
      fraction: bounded(share(found.longerHemiformals), LOGIT_SD.longerHemiformals),
    });
  const constant = (log10: number, sd: number) => ({ value: log10, low: log10 - Z95 * sd, high: log10 + Z95 * sd });
  const methanolK = methanol > 0 ? hemiacetalConstant(site, hydration, "methanol", contents.temperatureK) : undefined;
  const time = approachTime(site, hydration.log10, contents.temperatureK, pH);
  return {
    forms,
    free: (forms[0] as FormShare).fraction,
    sites: [
      {
        atom: site.atom,
        class: site.class,
        hydration: {
          log10: constant(hydration.log10, hydration.sd),
          method: hydration.method,
          source: hydration.source,
        },
        alcohols: methanolK
          ? [
              {
                name: "methanol",
                constant: {
                  log10: constant(methanolK.log10, methanolK.sd),
                  method: methanolK.method,
                  source: methanolK.source,
                },
              },
            ]
          : [],
      },
    ],
    ...(time ? { time } : {}),
    derivation: [
      { says: "formaldehyde, measured for this compound" },
      ...hydration.lines,
      {
        says: "Glycol chain: 2.7 for the dimer step and 4.2 for each further one, in ideal mole fractions",
        source: "Reuss et al., Ullmann, Formaldehyde (distribution at 40 wt%, 35 °C)",
      },
      ...(methanol > 0
        ? [
            {
              says: "Methanol takes glycols as hemiformals: exchange constant 35 at 25 °C",
              source: "Hahnenstein et al. 1995; Schmitz et al. 2015",
            },
          ]
        : []),
    ],
    cautions: [],
  };
}
