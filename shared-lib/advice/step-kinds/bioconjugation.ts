import type { StepKind } from "./types.ts";

/** Work in a buffer. */
export const bioconjugation: StepKind = {
  id: "bioconjugation",
  title: "Work in a buffer",
  consequence: "nothing is consumed",
  binds: "Water holds the carbonyl as hydrate; an amine buffer takes part of it.",
  consumed: "Nothing is consumed yet: the free concentration is what the next partner will meet.",
  source: "common practice, no source",
  words: ["stock", "standard", "made up", "conjugation", "labelling", "labeling"],
  sees: ({ buffered, alone }) => buffered && alone,
};
