import type { StepKind } from "./types.ts";

/** Oxime formation. */
export const oxime: StepKind = {
  id: "oxime",
  title: "Oxime formation",
  consequence: "the step is an equilibrium",
  binds: "Water holds part of the carbonyl as hydrate, alcohol as hemiacetal.",
  consumed: "The oxime is in equilibrium with them, far on its side: the apparent constant falls by the free share.",
  source: "Jencks, J. Am. Chem. Soc. 1959, 81, 475; Jencks, Prog. Phys. Org. Chem. 1964, 2, 63; recalled",
  constant: {
    aldehyde: { value: 8, low: 6, high: 10 },
    ketone: { value: 6, low: 4.5, high: 7.5 },
    partners: ["hydroxylamine"],
    releasesWater: true,
    source:
      "Jencks, Prog. Phys. Org. Chem. 1964, 2, 63: acetone about 1e6; aldehydes higher; recalled with a wide bound",
  },
  words: ["oxime"],
  sees: ({ has }) => has("hydroxylamine"),
};
