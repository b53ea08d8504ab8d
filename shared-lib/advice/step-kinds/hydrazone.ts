import type { StepKind } from "./types.ts";

/** Hydrazone formation. */
export const hydrazone: StepKind = {
  id: "hydrazone",
  title: "Hydrazone formation",
  consequence: "the step is an equilibrium",
  binds: "Water holds part of the carbonyl as hydrate, alcohol as hemiacetal.",
  consumed: "The hydrazone is in equilibrium with them: the apparent constant falls by the free share.",
  source: "Jencks, Prog. Phys. Org. Chem. 1964, 2, 63; recalled",
  constant: {
    atUnitHydration: { value: 4.5, low: 3.2, high: 6 },
    slope: 0.5,
    partners: ["hydrazine"],
    releasesWater: true,
    source:
      "Conant and Bartlett, J. Am. Chem. Soc. 1932, 54, 2881 (semicarbazones): acetone about 3e2, pyruvic acid about 2e5 (recalled, with a wide bound)",
  },
  words: ["hydrazone", "semicarbazone"],
  sees: ({ has }) => has("hydrazine"),
};
