/**
 * Formaldehyde: methanediol, glycol chains, hemiformals and their chains, a trace of free CH2O. Its exchange with methanol is
 * known better than either constant alone: CH2(OH)2 + CH3OH = HOCH2OCH3 + H2O, ln K = 0.423 + 933/T.
 */

import type { CarbonylSite } from "../../compounds/perception/types.ts";
import { pureMolarity } from "../vessel/pure-molarity.ts";
import { addChain, CHAIN_SOURCE } from "./chain.ts";
import { speciesOfSite } from "./molecule.ts";
import type { SiteOptions } from "./site-options.ts";
import type { Conditions, Species } from "./species.ts";

/** Chains are followed until what is left out is below 10⁻⁷ of the formaldehyde at 60 wt%. */
const LONGEST = { dilute: 8, concentrated: 60 };
const STEP_SD = { dimer: 0.06, exchange: 0.12 };
const LABELS: Readonly<Record<string, string>> = {
  "free carbonyl": "free formaldehyde",
  hydrate: "methanediol",
  "hydrate anion": "methanediol anion",
};

export function isFormaldehyde(site: CarbonylSite): boolean {
  return site.class === "formaldehyde";
}

/** ln of [HOCH2OCH3]/[CH2O] in neat methanol, from the exchange and the hydration constant. */
function lnHemiformal(lnHydration: number, temperatureK: number): number {
  const exchange = 0.423 + 933 / temperatureK;
  return (
    exchange + lnHydration + Math.log(pureMolarity("methanol", temperatureK) / pureMolarity("water", temperatureK))
  );
}

function relabelled(species: Species): Species {
  return { ...species, parts: species.parts.map((part) => ({ ...part, label: LABELS[part.kind] ?? part.label })) };
}

/** All species of formaldehyde, from the options of its one site. */
export function formaldehydeSpecies(options: SiteOptions, smiles: string, conditions: Conditions) {
  const lnHydration = Math.LN10 * options.constants.hydration.log10;
  const hydrationSource = `hydration ${options.site.atom}`;
  const monomers = speciesOfSite(options.options, smiles).map((one): Species => {
    if (one.parts[0]?.label !== "methanol hemiacetal") return relabelled(one);
    return {
      ...one,
      ln: lnHemiformal(lnHydration, conditions.temperatureK),
      errors: { [hydrationSource]: options.constants.hydration.sd, "exchange with methanol": STEP_SD.exchange },
      parts: [{ kind: "hemiacetal", label: "methoxymethanol", smiles: "COCO", share: 1 }],
    };
  });
  const species = [...monomers];
  const longest = conditions.concentrated ? LONGEST.concentrated : LONGEST.dilute;
  for (const one of monomers) {
    const part = one.parts[0];
    if (part?.kind !== "hydrate" && part?.kind !== "hemiacetal") continue;
    const label =
      part.kind === "hydrate"
        ? "poly(oxymethylene) glycols, n ≥ 2"
        : part.smiles === "COCO"
          ? "longer hemiformals"
          : `longer ${part.label}s`;
    addChain(species, one, {
      lnHydration,
      temperatureK: conditions.temperatureK,
      longest,
      label,
      stepSd: STEP_SD.dimer,
    });
  }
  const lines = [
    {
      says: "Glycol chain: 2.7 for the dimer step and 4.2 for each further one, in ideal mole fractions",
      source: CHAIN_SOURCE,
    },
    ...(conditions.alcohols.includes("methanol")
      ? [
          {
            says: `Methanol takes glycols as hemiformals: exchange constant ${Math.exp(0.423 + 933 / conditions.temperatureK).toFixed(0)}`,
            source: "Hahnenstein et al. 1995; Schmitz et al. 2015",
          },
        ]
      : []),
  ];
  return { species, lines };
}
