/** ln of what the medium does to each ratio beyond mass action, from the solvents that are free at the moment. */

import { type Composition, compositionOf } from "../../media/composition.ts";
import { hemiacetalFactor, hydrationFactor, type MediumFactor } from "../../media/medium-factor.ts";
import type { MediumCorrection } from "../forms/species.ts";
import { WATER } from "../forms/species.ts";
import type { Vessel } from "./ligands.ts";

/** Error of log10 where the carbonyl itself is the medium: neat mixtures of heptanal and methanol bind about half a unit more. */
const CARBONYL_AS_MEDIUM_SD = 0.35;

export interface Correction {
  readonly ln: number;
  /** Error of log10. */
  readonly sd: number;
  readonly factor?: MediumFactor;
}

/** Composition when `free` of each ligand (share of its total, 0 to 1) is left. */
export function freeComposition(vessel: Vessel, free: ReadonlyMap<string, number>, temperatureK: number): Composition {
  const parts = vessel.composition.components.map(({ solvent, amount }) => {
    const name = solvent.nucleophile === "water" ? WATER : solvent.key;
    return { solvent: solvent.key, amount: amount * (free.get(name) ?? 1) };
  });
  return compositionOf(parts, temperatureK);
}

function volumeShare(composition: Composition, name: string): number {
  let share = 0;
  for (const { solvent, volumeFraction } of composition.components)
    if (name === WATER ? solvent.nucleophile === "water" : solvent.key === name) share += volumeFraction;
  return share;
}

/**
 * The correction of that name. The medium's rule speaks of the whole ratio against the pure liquid; mass action already has the
 * ligand's concentration, so its volume share is taken out again.
 *
 * @param filled share of the volume that carbonyls fill, which the medium's rule does not see
 * @param freeWater free water relative to pure water, for condensations
 */
export function correctionOf(
  name: MediumCorrection,
  composition: Composition,
  temperatureK: number,
  saltActivity: number,
  filled: number,
  freeWater: number,
): Correction {
  if (name === "condensed") return { ln: -Math.log(Math.max(freeWater, 1e-3)), sd: 0 };
  const ligand = name.startsWith("alcohol:") ? name.slice("alcohol:".length) : WATER;
  const factor =
    ligand === WATER
      ? hydrationFactor(composition, temperatureK, {
          ketoAcid: name === "diol of a keto acid",
          acidicDiol: name === "acidic diol",
          saltActivity,
        })
      : hemiacetalFactor(composition, ligand, temperatureK);
  const share = volumeShare(composition, ligand);
  if (!Number.isFinite(factor.log10) || !(share > 0)) return { ln: 0, sd: 0 };
  const sd = Math.hypot(factor.sd, CARBONYL_AS_MEDIUM_SD * filled);
  return { ln: Math.LN10 * factor.log10 - Math.log(share), sd, factor };
}
