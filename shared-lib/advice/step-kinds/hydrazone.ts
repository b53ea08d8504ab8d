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
    aldehyde: { value: 5.5, low: 4, high: 7 },
    ketone: { value: 2.7, low: 2.2, high: 5.5 },
    partners: ["hydrazine"],
    releasesWater: true,
    source:
      "Conant and Bartlett, J. Am. Chem. Soc. 1932, 54, 2881 (semicarbazones): acetone 3e2, acetaldehyde 1e4 to 1e5; recalled with a wide bound",
  },
  words: ["hydrazone", "semicarbazone"],
  sees: ({ has }) => has("hydrazine"),
};
