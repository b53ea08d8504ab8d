import type { StepKind } from "./types.ts";

/** Bisulfite adduct. */
export const bisulfiteAdduct: StepKind = {
  id: "bisulfite-adduct",
  title: "Bisulfite adduct",
  consequence: "the step is an equilibrium",
  binds: "Water holds part of the carbonyl as hydrate.",
  consumed: "Bisulfite adds reversibly: the hydrate lowers the apparent constant by the free share.",
  source: "Olson and Hoffmann, Atmos. Environ. 1989, 23, 985; recalled",
  words: ["bisulfite", "bisulphite"],
  sees: ({ has }) => has("bisulfite"),
};
