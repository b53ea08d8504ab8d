import type { StepKind } from "./types.ts";

/** Imine or enamine formation. */
export const imine: StepKind = {
  id: "imine",
  title: "Imine or enamine formation",
  consequence: "the step is an equilibrium",
  binds: "Water holds part of the carbonyl as hydrate and drives the imine back.",
  consumed: "The imine is in equilibrium with amine and water: the apparent constant falls by the free share.",
  source: "Cordes and Jencks, J. Am. Chem. Soc. 1962, 84, 832; recalled",
  constant: {
    atUnitHydration: { value: 2, low: 0.5, high: 3.5 },
    slope: 0.7,
    partners: ["primary amine", "ammonia", "secondary amine"],
    releasesWater: true,
    source:
      "Jencks, Prog. Phys. Org. Chem. 1964, 2, 63, and later work on aliphatic imines in water (recalled, with a wide bound)",
  },
  words: ["imine", "schiff base", "enamine"],
  sees: ({ has }) => has("primary amine") || has("ammonia") || has("secondary amine"),
};
