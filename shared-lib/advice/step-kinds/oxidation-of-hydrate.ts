import type { StepKind } from "./types.ts";

/** Oxidation of an aldehyde through its hydrate. */
export const oxidationOfHydrate: StepKind = {
  id: "oxidation-of-hydrate",
  title: "Oxidation of an aldehyde through its hydrate",
  consequence: "the hydrate reacts",
  binds: "Water makes the hydrate, and the hydrate is what the oxidant takes.",
  consumed: "The hydrate gives the acid, so binding helps.",
  source:
    "Wiberg and Mill, J. Am. Chem. Soc. 1958, 80, 3022 (chromic acid); Bal, Childers and Pinnick, Tetrahedron 1981, 37, 2091 (chlorite); recalled",
  words: ["oxidation to the acid", "oxidation to acid"],
  sees: ({ has, aldehyde }) => aldehyde && (has("chromium oxidant") || has("hypohalite oxidant")),
};
