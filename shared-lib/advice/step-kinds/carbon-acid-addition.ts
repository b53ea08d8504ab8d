import type { StepKind } from "./types.ts";

/** Aldol, Henry or Knoevenagel reaction. */
export const carbonAcidAddition: StepKind = {
  id: "carbon-acid-addition",
  title: "Aldol, Henry or Knoevenagel reaction",
  consequence: "the step is an equilibrium",
  binds: "Water or alcohol holds part of the carbonyl.",
  consumed: "The addition is reversible until water leaves: the bound share lowers the conversion.",
  source: "Guthrie, Can. J. Chem. 1978, 56, 962; recalled",
  constant: {
    atUnitHydration: { value: 1.5, low: 0, high: 3 },
    slope: 1,
    partners: ["carbon acid"],
    releasesWater: false,
    source: "Guthrie, Can. J. Chem. 1978, 56, 962 (aldol additions; recalled, with a wide bound)",
  },
  words: ["aldol", "henry reaction", "nitroaldol", "knoevenagel", "claisen-schmidt"],
  sees: ({ has, carbonyls }) => has("carbon acid") || (carbonyls > 1 && has("base")),
};
