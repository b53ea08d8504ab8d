import type { StepKind } from "./types.ts";

/** Oxime formation. */
export const oxime: StepKind = {
  id: "oxime",
  title: "Oxime formation",
  consequence: "the step is an equilibrium",
  binds: "Water holds part of the carbonyl as hydrate, alcohol as hemiacetal.",
  consumed: "The oxime is in equilibrium with them, far on its side: the apparent constant falls by the free share.",
  source: "Jencks, J. Am. Chem. Soc. 1959, 81, 475; Jencks, Prog. Phys. Org. Chem. 1964, 2, 63; recalled",
  words: ["oxime"],
  sees: ({ has }) => has("hydroxylamine"),
};
