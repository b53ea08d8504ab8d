import type { StepKind } from "./types.ts";

/** Reduction with a hydride that water destroys. */
export const strongHydride: StepKind = {
  id: "strong-hydride",
  title: "Reduction with a hydride that water destroys",
  consequence: "water destroys the partner",
  binds: "A hydrate brings O-H that the hydride attacks first.",
  consumed: "Each O-H uses up one hydride and gives hydrogen.",
  source: "common practice, no source",
  words: ["lialh4", "dibal"],
  sees: ({ has }) => has("strong hydride") && has("reductant"),
};
