import type { StepKind } from "./types.ts";

/** Addition of an organometallic reagent. */
export const organometallic: StepKind = {
  id: "organometallic",
  title: "Addition of an organometallic reagent",
  consequence: "water destroys the partner",
  binds: "A hydrate or a hemiacetal has acidic O-H: it is water or alcohol to the reagent.",
  consumed: "Every mol of O-H destroys one mol of reagent before it adds.",
  source: "common practice, no source",
  words: ["grignard", "organolithium", "organometallic"],
  sees: ({ has }) => has("organometallic"),
};
