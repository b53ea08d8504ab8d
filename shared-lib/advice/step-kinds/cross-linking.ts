import type { StepKind } from "./types.ts";

/** Cross-linking or fixation of a protein. */
export const crossLinking: StepKind = {
  id: "cross-linking",
  title: "Cross-linking or fixation of a protein",
  consequence: "free carbonyl is consumed",
  binds: "Water holds the aldehyde as hydrate, and in formalin as chains, until the protein takes it.",
  consumed: "The small free share reacts with amino groups and is made good within minutes.",
  source:
    "Metz et al., J. Biol. Chem. 2004, 279, 6235 (formaldehyde); Migneault et al., BioTechniques 2004, 37, 790 (glutaraldehyde); recalled",
  words: ["fixation", "fixing", "cross-link", "crosslink"],
  sees: ({ has }) => has("protein"),
};
