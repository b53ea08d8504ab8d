import type { StepKind } from "./types.ts";

/** Mannich reaction. */
export const mannich: StepKind = {
  id: "mannich",
  title: "Mannich reaction",
  consequence: "free carbonyl is consumed",
  binds: "Water and alcohol hold formaldehyde almost wholly; the amine takes it from them as iminium ion.",
  consumed: "The carbon acid takes the iminium ion; water is not held against it.",
  source: "Blicke, Org. React. 1942, 1, 303; recalled",
  words: ["mannich"],
  sees: ({ has, formaldehyde, carbonyls }) =>
    formaldehyde &&
    (has("secondary amine") || has("primary amine") || has("ammonia")) &&
    (has("carbon acid") || carbonyls > 1),
};
