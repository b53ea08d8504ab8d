import type { StepKind } from "./types.ts";

/** Cyanohydrin formation. */
export const cyanohydrin: StepKind = {
  id: "cyanohydrin",
  title: "Cyanohydrin formation",
  consequence: "the step is an equilibrium",
  binds: "Water holds part of the carbonyl as hydrate.",
  consumed: "Cyanide adds reversibly: the hydrate lowers the conversion by its share.",
  source: "Ching and Kallen, J. Am. Chem. Soc. 1978, 100, 6119; recalled",
  constant: {
    aldehyde: { value: 3.5, low: 2.3, high: 5 },
    ketone: { value: 1.2, low: 0.5, high: 2 },
    partners: ["cyanide"],
    releasesWater: false,
    source:
      "Ching and Kallen, J. Am. Chem. Soc. 1978, 100, 6119: benzaldehyde about 2.4e2; aliphatic aldehydes and ketones recalled with a wide bound",
  },
  words: ["cyanohydrin"],
  sees: ({ has }) => has("cyanide"),
};
