/** Amounts of solvents to mole and volume fractions; volumes are additive (at most 3.6 % high: CRC Handbook densities of aqueous mixtures). */

import type { MediumKind } from "../model/contract.ts";
import { molarVolume, type Solvent, solventByKey } from "./solvents.ts";

export interface MediumAmount {
  /** Key of the solvents table. */
  readonly solvent: string;
  /** mol */
  readonly amount: number;
}

export interface Component {
  readonly solvent: Solvent;
  /** mol */
  readonly amount: number;
  readonly moleFraction: number;
  readonly volumeFraction: number;
  /** mol/L, of the volume of all solvents. */
  readonly molarity: number;
}

export interface Composition {
  readonly components: readonly Component[];
  /** L, at the temperature asked for. */
  readonly volumeL: number;
}

/** Adds up the rows of one solvent; rows without a positive, finite amount or of an unknown solvent are left out. */
export function compositionOf(parts: readonly MediumAmount[], temperatureK: number): Composition {
  const amounts = new Map<Solvent, number>();
  for (const { solvent: key, amount } of parts) {
    const solvent = solventByKey(key);
    if (solvent && amount > 0 && Number.isFinite(amount)) amounts.set(solvent, (amounts.get(solvent) ?? 0) + amount);
  }
  let moles = 0;
  let volumeL = 0;
  for (const [solvent, amount] of amounts) {
    moles += amount;
    volumeL += amount * molarVolume(solvent, temperatureK);
  }
  const components: Component[] = [];
  for (const [solvent, amount] of amounts) {
    components.push({
      solvent,
      amount,
      moleFraction: amount / moles,
      volumeFraction: (amount * molarVolume(solvent, temperatureK)) / volumeL,
      molarity: amount / volumeL,
    });
  }
  return { components, volumeL };
}

/** What a mixture is to a carbonyl: water, alcohol, both or either beside others, or neither. Traces (below 5 % by volume) do not count. */
export function mediumKind(composition: Composition): MediumKind {
  let water = 0;
  let alcohol = 0;
  let other = 0;
  for (const { solvent, volumeFraction } of composition.components) {
    if (solvent.nucleophile === "water") water += volumeFraction;
    else if (solvent.nucleophile === "alcohol") alcohol += volumeFraction;
    else other += volumeFraction;
  }
  const trace = 0.05;
  if (composition.components.length === 0) return "unknown";
  if (water <= trace && alcohol <= trace) return "aprotic";
  if (alcohol <= trace && other <= trace) return "aqueous";
  if (water <= trace && other <= trace) return "alcoholic";
  return "mixed";
}
