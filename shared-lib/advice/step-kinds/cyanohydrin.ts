import type { StepKind } from "./types.ts";

/** Cyanohydrin formation. */
export const cyanohydrin: StepKind = {
  id: "cyanohydrin",
  title: "Cyanohydrin formation",
  consequence: "the step is an equilibrium",
  binds: "Water holds part of the carbonyl as hydrate.",
  consumed: "Cyanide adds reversibly: the hydrate lowers the conversion by its share.",
  source: "Ching and Kallen, J. Am. Chem. Soc. 1978, 100, 6119; recalled",
  words: ["cyanohydrin"],
  sees: ({ has }) => has("cyanide"),
};
