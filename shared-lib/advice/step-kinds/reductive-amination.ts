import type { StepKind } from "./types.ts";

/** Reductive amination. */
export const reductiveAmination: StepKind = {
  id: "reductive-amination",
  title: "Reductive amination",
  consequence: "free carbonyl is consumed",
  binds: "The solvent holds the carbonyl as hydrate or hemiacetal, the amine as imine or iminium ion.",
  consumed: "The iminium ion is reduced irreversibly and the free share is made good meanwhile.",
  source:
    "Borch, Bernstein and Durst, J. Am. Chem. Soc. 1971, 93, 2897; Abdel-Magid et al., J. Org. Chem. 1996, 61, 3849; recalled",
  words: ["reductive amination", "reductive alkylation"],
  sees: ({ has }) =>
    has("mild hydride") || (has("borohydride") && (has("primary amine") || has("secondary amine") || has("ammonia"))),
};
