import type { StepKind } from "./types.ts";

/** Reduction with a borohydride. */
export const hydrideReduction: StepKind = {
  id: "hydride-reduction",
  title: "Reduction with a borohydride",
  consequence: "free carbonyl is consumed",
  binds: "Water or alcohol holds the carbonyl as hydrate or hemiacetal.",
  consumed: "Borohydride takes the free share irreversibly; it also reacts with the solvent while it waits.",
  source: "Brown, Wheeler and Ichikawa, Tetrahedron 1957, 1, 214; recalled",
  words: ["borohydride reduction", "nabh4"],
  sees: ({ has }) => has("borohydride"),
};
