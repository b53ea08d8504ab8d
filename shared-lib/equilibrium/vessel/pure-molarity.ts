/** mol/L of the pure solvents: the reference that ratios to water and alcohols are counted from. */

import { molarVolume, solventByKey } from "../../media/solvents.ts";

/** mol/L of a pure solvent at a temperature; 1 for an unknown key. */
export function pureMolarity(key: string, temperatureK: number): number {
  const solvent = solventByKey(key);
  return solvent ? 1 / molarVolume(solvent, temperatureK) : 1;
}
