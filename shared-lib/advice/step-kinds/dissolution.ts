import type { StepKind } from "./types.ts";

/** Dissolution only. */
export const dissolution: StepKind = {
  id: "dissolution",
  title: "Dissolution only",
  consequence: "nothing is consumed",
  binds: "Water, alcohol or the compound's own hydroxyl holds the carbonyl.",
  consumed: "Nothing is consumed: the free concentration is what the next partner will meet.",
  source: "common practice, no source",
  words: ["stock", "standard", "made up", "dissolution", "solubility"],
  sees: ({ alone }) => alone,
};
