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
    atUnitHydration: { value: 4.3, low: 3.3, high: 5.3 },
    slope: 1,
    partners: ["cyanide"],
    releasesWater: false,
    source:
      "Ching and Kallen, J. Am. Chem. Soc. 1978, 100, 6119: benzaldehyde about 2.4e2 (recalled); slope as for other additions",
  },
  words: ["cyanohydrin"],
  sees: ({ has }) => has("cyanide"),
};
