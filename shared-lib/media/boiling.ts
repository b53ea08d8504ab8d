/** At what temperature a mixture boils at 1 atm: the temperature of a note that says "reflux". */

import { activitiesOf } from "./activities.ts";
import { type Composition, compositionOf } from "./composition.ts";
import type { Solvent } from "./solvents.ts";

const GAS = 8.314462618e-3;

/**
 * Enthalpy of vaporization at the boiling point, kJ/mol: the table's, else the Trouton–Hildebrand–Everett rule, ΔS = R (4.4 + ln T_b),
 * a fifth more for alcohols and acids.
 */
function vaporization(solvent: Solvent, boilingK: number): number {
  if (solvent.vaporizationKJ !== undefined) return solvent.vaporizationKJ;
  const associated = solvent.nucleophile === "alcohol" ? 1.2 : 1;
  return GAS * boilingK * (4.4 + Math.log(boilingK)) * associated;
}

/** Vapour pressure in atm by Clausius and Clapeyron from the boiling point; within 3 % to 25 K away from it. */
export function vapourPressure(solvent: Solvent, temperatureK: number): number | undefined {
  if (solvent.boilingC === undefined) return undefined;
  const boilingK = solvent.boilingC + 273.15;
  return Math.exp((-vaporization(solvent, boilingK) / GAS) * (1 / temperatureK - 1 / boilingK));
}

/** Sum of the partial pressures over a mixture, atm; two liquid phases each give the pressure of the other's saturated solution. */
function totalPressure(composition: Composition, temperatureK: number): number {
  const amounts = composition.components.map(({ solvent, amount }) => ({ solvent: solvent.key, amount }));
  const { activity } = activitiesOf(compositionOf(amounts, temperatureK), temperatureK);
  let sum = 0;
  for (const { solvent, moleFraction } of composition.components)
    sum += (activity[solvent.key] ?? moleFraction) * (vapourPressure(solvent, temperatureK) ?? 0);
  return sum;
}

/**
 * Bubble point of a mixture of solvents at 1 atm, K (ideal vapour, activities by the model; azeotropes to about 1 K).
 *
 * @returns undefined when no component has a boiling point
 */
export function mixtureBoilingPoint(composition: Composition): number | undefined {
  const known = composition.components.flatMap(({ solvent }) =>
    solvent.boilingC === undefined ? [] : [solvent.boilingC + 273.15],
  );
  if (known.length === 0) return undefined;
  let low = Math.min(...known) - 45;
  let high = Math.max(...known) + 10;
  for (let step = 0; step < 30 && high - low > 0.02; step++) {
    const middle = (low + high) / 2;
    if (totalPressure(composition, middle) > 1) high = middle;
    else low = middle;
  }
  return (low + high) / 2;
}
