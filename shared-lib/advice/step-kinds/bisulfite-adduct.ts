import type { StepKind } from "./types.ts";

/** Bisulfite adduct. */
export const bisulfiteAdduct: StepKind = {
  id: "bisulfite-adduct",
  title: "Bisulfite adduct",
  consequence: "the step is an equilibrium",
  binds: "Water holds part of the carbonyl as hydrate.",
  consumed: "Bisulfite adds reversibly: the hydrate lowers the apparent constant by the free share.",
  source: "Olson and Hoffmann, Atmos. Environ. 1989, 23, 985; recalled",
  constant: {
    atUnitHydration: { value: 5.8, low: 5, high: 6.6 },
    slope: 1,
    partners: ["bisulfite"],
    releasesWater: false,
    source:
      "Betterton, Erel and Hoffmann, Environ. Sci. Technol. 1988, 22, 92: acetaldehyde 6.9e5, glycolaldehyde 2.0e6, linear in Taft's constants; benzaldehyde 6.2e3 (method of Kokesh and Hall) gives the slope",
  },
  words: ["bisulfite", "bisulphite"],
  sees: ({ has }) => has("bisulfite"),
};
