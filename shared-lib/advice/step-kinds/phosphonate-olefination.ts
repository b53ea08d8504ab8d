import type { StepKind } from "./types.ts";

/** Olefination with a phosphonate. */
export const phosphonateOlefination: StepKind = {
  id: "phosphonate-olefination",
  title: "Olefination with a phosphonate",
  consequence: "free carbonyl is consumed",
  binds: "In water or alcohol the aldehyde is held as hydrate or hemiacetal.",
  consumed: "The phosphonate carbanion takes free aldehyde irreversibly, and base refills it quickly.",
  source: "Wadsworth and Emmons, J. Am. Chem. Soc. 1961, 83, 1733; recalled",
  words: ["horner", "olefination"],
  sees: ({ has }) => has("phosphonate"),
};
