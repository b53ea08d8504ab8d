/** What carbonyls can take up in a vessel: water, alcohols, dissolved partners; amounts, and the unit in which each is counted. */

import { type Component, type Composition, compositionOf } from "../../media/composition.ts";
import { densityAt } from "../../media/solvents.ts";
import { partnerKind } from "../adducts/adducts.ts";
import { type Partner, WATER } from "../forms/species.ts";
import type { Contents } from "../types.ts";

export interface Ligand {
  readonly name: string;
  /** mol in all forms. */
  readonly total: number;
  /** mol/L that count as 1: the pure liquid, or 1 for a dissolved partner. */
  readonly unit: number;
}

export interface Vessel {
  readonly composition: Composition;
  /** L, of solvents and carbonyls. */
  readonly volumeL: number;
  readonly ligands: readonly Ligand[];
  readonly partners: readonly Partner[];
}

/** g/mL of a carbonyl whose density is not known. */
const USUAL_DENSITY = 1;
/** Below this share of the volume there is too little water to use adduct constants measured in water. */
const AQUEOUS = 0.05;

/** Amount that is a number above 0, else 0. */
export function soundAmount(amount: number): number {
  return amount > 0 && Number.isFinite(amount) ? amount : 0;
}

function litresOf(row: Contents["carbonyls"][number]): number {
  return (soundAmount(row.amount) * row.compound.molarMass) / (row.compound.density ?? USUAL_DENSITY) / 1000;
}

function molarityOfPure(component: Component, temperatureK: number): number {
  const { solvent } = component;
  return (1000 * densityAt(solvent, temperatureK)) / solvent.molarMass;
}

function solventLigands(composition: Composition, temperatureK: number): Ligand[] {
  const ligands: Ligand[] = [];
  let water = 0;
  let unit = 0;
  for (const component of composition.components) {
    if (component.solvent.nucleophile === "alcohol")
      ligands.push({
        name: component.solvent.key,
        total: component.amount,
        unit: molarityOfPure(component, temperatureK),
      });
    if (component.solvent.nucleophile !== "water") continue;
    water += component.amount;
    unit = molarityOfPure(component, temperatureK);
  }
  if (water > 0) ligands.push({ name: WATER, total: water, unit });
  return ligands;
}

function isAqueous(composition: Composition): boolean {
  let water = 0;
  for (const { solvent, volumeFraction } of composition.components)
    if (solvent.nucleophile === "water") water += volumeFraction;
  return water >= AQUEOUS;
}

/**
 * Ligands of a vessel.
 *
 * @param everyPartner also the condensations that are told apart (amines, hydroxylamine, hydrazine)
 */
export function vesselOf(contents: Contents, everyPartner: boolean): Vessel {
  const composition = compositionOf(contents.solvents, contents.temperatureK);
  const volumeL = composition.volumeL + contents.carbonyls.reduce((sum, row) => sum + litresOf(row), 0);
  const ligands = solventLigands(composition, contents.temperatureK);
  const partners: Partner[] = [];
  const amounts = new Map<string, number>();
  if (isAqueous(composition))
    for (const { compound, amount } of contents.solutes) {
      const kind = partnerKind(compound);
      // A buffer's amine is never what the step is for: its adduct counts with the forms.
      const counted = kind?.counted || compound.id === contents.buffer?.buffer;
      if (!kind || !(soundAmount(amount) > 0) || !(counted || everyPartner)) continue;
      if (!amounts.has(compound.id)) partners.push({ compound, kind });
      amounts.set(compound.id, (amounts.get(compound.id) ?? 0) + amount);
    }
  for (const [id, total] of amounts) ligands.push({ name: `with:${id}`, total, unit: 1 });
  return { composition, volumeL, ligands, partners };
}
