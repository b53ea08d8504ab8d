import type { StepKind } from "./types.ts";

/** Acetal formation. */
export const acetal: StepKind = {
  id: "acetal",
  title: "Acetal formation",
  consequence: "the alcohol is the partner",
  binds:
    "The alcohol makes the hemiacetal on the way to the acetal; water makes the hydrate and drives the acetal back.",
  consumed: "The acetal is in equilibrium with alcohol and water: the water counts, the hemiacetal does not.",
  source: "common practice, no source",
  words: ["acetal", "ketal", "dioxolane"],
  sees: ({ has, alcoholShare }) =>
    has("alcohol") && alcoholShare < 0.5 && (has("strong acid") || has("acid")) && !has("base"),
};
