import type { StepKind } from "./types.ts";

/** Imine or enamine formation. */
export const imine: StepKind = {
  id: "imine",
  title: "Imine or enamine formation",
  consequence: "the step is an equilibrium",
  binds: "Water holds part of the carbonyl as hydrate and drives the imine back.",
  consumed: "The imine is in equilibrium with amine and water: the apparent constant falls by the free share.",
  source: "Cordes and Jencks, J. Am. Chem. Soc. 1962, 84, 832; recalled",
  words: ["imine", "schiff base", "enamine"],
  sees: ({ has }) => has("primary amine") || has("ammonia") || has("secondary amine"),
};
