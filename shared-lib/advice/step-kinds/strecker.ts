import type { StepKind } from "./types.ts";

/** Strecker reaction. */
export const strecker: StepKind = {
  id: "strecker",
  title: "Strecker reaction",
  consequence: "the step is an equilibrium",
  binds: "Water, amine and cyanide share the carbonyl.",
  consumed: "The amino nitrile is formed reversibly until it is worked up.",
  source: "Schlesinger and Miller, J. Am. Chem. Soc. 1973, 95, 3729; recalled",
  words: ["strecker"],
  sees: ({ has }) => has("cyanide") && (has("primary amine") || has("secondary amine") || has("ammonia")),
};
