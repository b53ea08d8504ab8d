/** The solvents table. */

import table from "../generated/solvents.json" with { type: "json" };

export interface Solvent {
  /** Short plain name, the key everywhere else ("water", "methanol", "THF"). */
  readonly key: string;
  readonly name: string;
  readonly synonyms: readonly string[];
  readonly smiles: string;
  readonly cas: string;
  /** g/mol */
  readonly molarMass: number;
  /** g/mL at 25 °C, and its change in g/(mL K). */
  readonly density: number;
  readonly densitySlope: number;
  readonly boilingC?: number;
  readonly meltingC?: number;
  /** kJ/mol at the boiling point; absent: estimated. */
  readonly vaporizationKJ?: number;
  /** What it adds to a C=O. */
  readonly nucleophile: "water" | "alcohol" | "none";
  readonly kind: "water" | "alcohol" | "acid" | "amine" | "ketone" | "aprotic";
  /** Neither O, N, P nor S: it does not solvate the O–H of an adduct. */
  readonly weaklySolvating: boolean;
  /** Usual mass fraction of water in the bottle. */
  readonly bottleWater: number;
  /** Miscible with water in all proportions at 25 °C. */
  readonly miscible: boolean;
  /** Temperatures (°C) between which it forms two phases with water although it mixes at others. */
  readonly splits?: readonly [number, number];
  /** Mole fraction of water in the solvent saturated with it at 25 °C, where it takes up little. */
  readonly waterSaturation?: number;
  /** Expected error of ln a of water beside it. */
  readonly sdLnWaterActivity: number;
  /** Azeotrope with water at 1 atm. */
  readonly azeotrope?: string;
  readonly source: string;
}

const ROWS = table as unknown as readonly Solvent[];
const BY_KEY = new Map(ROWS.map((row) => [row.key, row]));

export function allSolvents(): readonly Solvent[] {
  return ROWS;
}

export function solventByKey(key: string): Solvent | undefined {
  return BY_KEY.get(key);
}

/** g/mL at a temperature; the table's line, held to within 100 K of 25 °C. */
export function densityAt(solvent: Solvent, temperatureK: number): number {
  const change = Math.max(-100, Math.min(100, temperatureK - 298.15));
  return solvent.density + solvent.densitySlope * change;
}

/** L/mol at a temperature. */
export function molarVolume(solvent: Solvent, temperatureK: number): number {
  return solvent.molarMass / densityAt(solvent, temperatureK) / 1000;
}

/** mol in a volume (L) measured at a temperature (K). */
export function molesInVolume(solvent: Solvent, volumeL: number, temperatureK = 298.15): number {
  return volumeL / molarVolume(solvent, temperatureK);
}

/** mol in a mass (g). */
export function molesInMass(solvent: Solvent, massG: number): number {
  return massG / solvent.molarMass;
}
