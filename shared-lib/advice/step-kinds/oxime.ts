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
    atUnitHydration: { value: 7.5, low: 6, high: 9 },
    slope: 0.5,
    partners: ["hydroxylamine"],
    releasesWater: true,
    source: "Jencks, Prog. Phys. Org. Chem. 1964, 2, 63: acetone about 1e6 (recalled, with a wide bound)",
  },
  words: ["oxime"],
  sees: ({ has }) => has("hydroxylamine"),
};
