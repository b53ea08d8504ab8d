import type { StepKind } from "./types.ts";

/** Hydrazone formation. */
export const hydrazone: StepKind = {
  id: "hydrazone",
  title: "Hydrazone formation",
  consequence: "the step is an equilibrium",
  binds: "Water holds part of the carbonyl as hydrate, alcohol as hemiacetal.",
  consumed: "The hydrazone is in equilibrium with them: the apparent constant falls by the free share.",
  source: "Jencks, Prog. Phys. Org. Chem. 1964, 2, 63; recalled",
  words: ["hydrazone", "semicarbazone"],
  sees: ({ has }) => has("hydrazine"),
};
