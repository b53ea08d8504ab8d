import type { StepKind } from "./types.ts";

/** Olefination with a phosphorus ylide. */
export const ylideOlefination: StepKind = {
  id: "ylide-olefination",
  title: "Olefination with a phosphorus ylide",
  consequence: "water destroys the partner",
  binds: "The hydrate holds the aldehyde back and brings water.",
  consumed: "Water hydrolyses a non-stabilised ylide; a stabilised one stands it.",
  source: "Dambacher et al., Tetrahedron Lett. 2005, 46, 4473 (stabilised ylides in water); recalled",
  words: ["wittig"],
  sees: ({ has, waterShare }) => has("phosphorus ylide") && waterShare < 0.1,
};
