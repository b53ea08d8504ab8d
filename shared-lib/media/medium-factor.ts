/**
 * What the medium does to the ratio hydrate : carbonyl, against dilute water.
 * Rule: ratio = K_w · φ_w · √max(1, a_w³/φ_w), the geometric mean between proportionality to the water's volume fraction and the published
 * third power of its activity for aliphatic aldehydes in dioxane–water and salt solutions (Buschmann, Knoche and co-workers; abstract read).
 * It is a judgement between two assessments, not a measurement; the bound says so. The page beside this file has the evidence.
 */

import type { DerivationLine } from "../model/contract.ts";
import { activitiesOf } from "./activities.ts";
import type { Composition } from "./composition.ts";

export interface MediumFactor {
  readonly log10: number;
  readonly sd: number;
  readonly lines: readonly DerivationLine[];
}

/** What of the compound changes the rule. */
export interface MediumTraits {
  /** An α-keto acid: its hydration falls with the sixth to seventh power of the activity. */
  readonly ketoAcid: boolean;
  /** A diol acidic enough for DMSO to hold it (aryl trifluoromethyl ketones, 2-nitrobenzaldehyde). */
  readonly acidicDiol: boolean;
}

/** Error of log10 by the share of water, from the assessments of mixed media. */
function floorSd(waterVolumeFraction: number, protic: boolean): number {
  if (waterVolumeFraction > 0.995) return 0.02;
  if (protic) return 0.15;
  if (waterVolumeFraction > 0.5) return 0.1;
  return waterVolumeFraction > 0.1 ? 0.25 : 0.5;
}

function waterShares(composition: Composition): { phi: number; water: number; protic: boolean; dmso: boolean } {
  let phi = 0;
  let water = 0;
  let proticShare = 0;
  let dmso = false;
  for (const component of composition.components) {
    if (component.solvent.nucleophile === "water") {
      phi += component.volumeFraction;
      water += component.moleFraction;
    }
    if (component.solvent.nucleophile === "alcohol") proticShare += component.volumeFraction;
    if (component.solvent.key.startsWith("DMSO") && component.volumeFraction > 0.1) dmso = true;
  }
  return { phi, water, protic: phi + proticShare > 0.98, dmso };
}

/** log10 of ([diol]/[C=O] here over [diol]/[C=O] in dilute water at the same temperature); −∞ without any water. */
export function hydrationFactor(composition: Composition, temperatureK: number, traits: MediumTraits): MediumFactor {
  const { phi, water, protic, dmso } = waterShares(composition);
  if (phi <= 0) return { log10: Number.NEGATIVE_INFINITY, sd: 0, lines: [] };
  if (phi > 0.9999) return { log10: 0, sd: floorSd(phi, true), lines: [] };
  if (dmso && traits.acidicDiol) {
    const log10 = water >= 0.15 ? 0 : Math.log10(water / 0.15);
    return {
      log10,
      sd: 0.4,
      lines: [
        {
          says: "DMSO holds an acidic diol: hydration stays as in water down to 15 mol % water",
          source: "Stewart, Van Dyke, Can. J. Chem. 1970, 48, 3961 (abstract)",
        },
      ],
    };
  }
  const activities = activitiesOf(composition, temperatureK);
  const activity = activities.activity.water ?? activities.activity.D2O ?? water;
  const cubed = activity ** 3;
  const lift = protic || dmso || traits.ketoAcid ? 1 : Math.sqrt(Math.max(1, cubed / phi));
  const log10 = Math.log10(phi * lift);
  const between = Math.min(0.5, Math.abs(Math.log10(cubed / phi)) / 2 + 0.1);
  const sd = traits.ketoAcid ? 0.7 : Math.max(floorSd(phi, protic), protic ? 0 : between / 1.96);
  const lines: DerivationLine[] = [
    {
      says: `Water here: volume fraction ${phi.toFixed(3)}, activity ${activity.toFixed(3)} (modified UNIFAC, Dortmund)`,
      source: "Weidlich, Gmehling 1987; parameters to 2016",
    },
    {
      says:
        lift > 1
          ? "Hydration scales between the volume fraction and the third power of the activity of water"
          : "Hydration scales with the volume fraction of water",
      value: `× ${(phi * lift).toPrecision(2)}`,
      source: "our rule between two published limits",
    },
  ];
  return { log10, sd, lines };
}

/** log10 of ([hemiacetal]/[C=O] here over that in the neat alcohol): its volume fraction. */
export function hemiacetalFactor(composition: Composition, alcohol: string): MediumFactor {
  const component = composition.components.find((candidate) => candidate.solvent.key === alcohol);
  if (!component) return { log10: Number.NEGATIVE_INFINITY, sd: 0, lines: [] };
  const phi = component.volumeFraction;
  return {
    log10: Math.log10(phi),
    sd: phi > 0.995 ? 0.05 : phi > 0.1 ? 0.15 : 0.3,
    lines:
      phi > 0.9999
        ? []
        : [
            {
              says: `${alcohol} is ${(phi * 100).toPrecision(2)} % of the volume: the hemiacetal ratio scales with it`,
            },
          ],
  };
}
