/** Which forms every carbonyl of a vessel takes: constants, medium, mass balance, bounds. Total and deterministic; never throws. */

import { activitiesOf } from "../media/activities.ts";
import { compositionOf } from "../media/composition.ts";
import { formsOfCarbonyl } from "./carbonyl-forms.ts";
import { freeSolvents } from "./mass-balance.ts";
import type { Contents, SpeciateOptions, Speciation } from "./types.ts";

const NEUTRAL_PH = 7;

/**
 * Speciation of a vessel.
 *
 * @param contents amounts in mol, K, L; rows that are not finite are left out
 * @returns one entry per carbonyl of the contents, in their order; one that the model cannot answer says why in `outside`
 */
export function speciate(contents: Contents, options: SpeciateOptions = {}): Speciation {
  const temperatureK =
    Number.isFinite(contents.temperatureK) && contents.temperatureK > 0 ? contents.temperatureK : 298.15;
  const pH = contents.pH !== undefined && Number.isFinite(contents.pH) ? contents.pH : NEUTRAL_PH;
  const vessel = { ...contents, temperatureK };
  const initial = compositionOf(contents.solvents, temperatureK);
  const free = freeSolvents(vessel, pH, options);
  const activities = activitiesOf(free.composition, temperatureK);
  return {
    carbonyls: contents.carbonyls.map((row) => formsOfCarbonyl(row, vessel, free, pH, options)),
    activities: activities.activity,
    volumeL: contents.volumeL ?? initial.volumeL,
  };
}
