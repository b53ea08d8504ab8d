/**
 * Hydration constants from the correlation alone against published measurements, the source beside each. The regression has not seen
 * the rows of the first table; those of the second it has, so their answers are compared with wider meaning in scripts/accuracy.mts
 * (leave-one-out). "recalled": the number was not read in the source named.
 */

import { describe, expect, it } from "vitest";
import { createStructureToolkit } from "../../shared-lib/compounds/structure.ts";
import { hydrationConstant } from "../../shared-lib/equilibrium/constants/hydration.ts";
import type { ChargeState } from "../../shared-lib/equilibrium/constants/types.ts";

const toolkit = createStructureToolkit();

function estimated(smiles: string, options: { celsius?: number; measured?: boolean; state?: ChargeState } = {}) {
  const reading = toolkit.read(smiles);
  const like = reading.ok ? (reading.carbonyl?.sites.filter((site) => site.leading) ?? []) : [];
  const site = like[0];
  if (!reading.ok || !site) throw new Error(`${smiles} has no site`);
  const found = hydrationConstant(reading.canonicalSmiles, site, like.length, {
    temperatureK: (options.celsius ?? 25) + 273.15,
    state: options.state ?? "neutral",
    correlationOnly: options.measured !== true,
  });
  if ("outside" in found) throw new Error(found.outside);
  // Published constants count every like C=O.
  return { ...found, log10: found.log10 + Math.log10(like.length) };
}

/** log K, 25 °C, water. */
const UNSEEN: readonly (readonly [string, string, number, string])[] = [
  ["hexanal", "CCCCCC=O", -0.31, "Sham, Joens, Spectrochim. Acta A 1995, 51, 247"],
  ["hexanal", "CCCCCC=O", -0.39, "Buschmann, Füldner, Knoche, Ber. Bunsenges. Phys. Chem. 1980, 84, 41"],
  ["2-chloro-2-methylpropanal", "CC(C)(Cl)C=O", 1.19, "Le Henaff, Bull. Soc. Chim. Fr. 1968, 4687"],
  ["2-chlorobutanal", "CCC(Cl)C=O", 1.61, "Le Henaff 1968"],
  ["2-chloroheptanal", "CCCCCC(Cl)C=O", 1.28, "Le Henaff 1968"],
  ["2-bromobutanal", "CCC(Br)C=O", 1.12, "Le Henaff 1968"],
  ["fluoroacetone", "CC(=O)CF", -0.78, "Guthrie, J. Am. Chem. Soc. 1978, 100, 5892"],
  ["1,3-dibromoacetone", "O=C(CBr)CBr", 0.27, "Buschmann, Füldner, Knoche 1980"],
  ["3-methyl-2-oxobutanoic acid", "CC(C)C(=O)C(=O)O", 0.05, "Cooper, Redfield, J. Biol. Chem. 1975, 250, 527"],
  ["3-methyl-2-oxopentanoic acid", "CCC(C)C(=O)C(=O)O", 0.18, "Cooper, Redfield 1975"],
  ["2-oxoadipic acid", "O=C(O)CCCC(=O)C(=O)O", 0.23, "Cooper, Redfield 1975"],
  ["diethyl oxaloacetate", "CCOC(=O)CC(=O)C(=O)OCC", 1.15, "Kozlowski, Zuman, J. Electroanal. Chem. 1987, 226, 69"],
  ["3,4-hexanedione", "CCC(=O)C(=O)CC", 0.01, "Montoya, Mellado, J. Electroanal. Chem. 1994, 370, 183"],
  [
    "ethyl pyruvate",
    "CC(=O)C(=O)OCC",
    0.41,
    "Buschmann, Dutkiewicz, Knoche, Ber. Bunsenges. Phys. Chem. 1982, 86, 129",
  ],
  ["fluoropyruvic acid", "FCC(=O)C(=O)O", 2.58, "Hurley et al., Arch. Biochem. Biophys. 1979, 193, 478"],
  ["3,4-dichlorobenzaldehyde", "O=Cc1ccc(Cl)c(Cl)c1", -1.35, "McClelland, Coe, J. Am. Chem. Soc. 1983, 105, 2718"],
  ["4-chloro-3-nitrobenzaldehyde", "O=Cc1ccc(Cl)c(c1)[N+](=O)[O-]", -0.74, "McClelland, Coe 1983"],
];

const SEEN: readonly (readonly [string, string, number, string])[] = [
  ["acetaldehyde", "CC=O", 0.08, "Buschmann, Füldner, Knoche 1980"],
  ["propanal", "CCC=O", 0.09, "Buschmann, Füldner, Knoche 1980"],
  ["butanal", "CCCC=O", -0.24, "Buschmann, Füldner, Knoche 1980"],
  ["pentanal", "CCCCC=O", -0.26, "Sham, Joens 1995"],
  ["2-methylpropanal", "CC(C)C=O", -0.29, "Sham, Joens 1995"],
  ["2,2-dimethylpropanal", "CC(C)(C)C=O", -0.64, "Le Henaff 1968"],
  ["chloroacetaldehyde", "O=CCCl", 1.46, "Le Henaff 1968"],
  ["trichloroacetaldehyde", "O=CC(Cl)(Cl)Cl", 4.45, "Le Henaff 1968"],
  [
    "trifluoroacetaldehyde",
    "O=CC(F)(F)F",
    4.46,
    "Bartberger et al., Proc. Natl. Acad. Sci. USA 2001, 98, 2194, table 3",
  ],
  ["glycolaldehyde", "OCC=O", 0.95, "Buschmann, Füldner, Knoche 1980"],
  ["acetone", "CC(C)=O", -2.85, "Guthrie 1978"],
  ["chloroacetone", "CC(=O)CCl", -1.04, "Buschmann, Füldner, Knoche 1980"],
  ["1,1,1-trifluoroacetone", "CC(=O)C(F)(F)F", 1.54, "Buschmann, Füldner, Knoche 1980"],
  ["1,1-dichloroacetone", "CC(=O)C(Cl)Cl", 0.45, "Guthrie, Can. J. Chem. 1975, 53, 898"],
  ["hexafluoroacetone", "O=C(C(F)(F)F)C(F)(F)F", 6.08, "Guthrie 1975"],
  ["2,3-butanedione", "CC(=O)C(C)=O", 0.32, "Buschmann, Füldner, Knoche 1980"],
  ["methyl pyruvate", "CC(=O)C(=O)OC", 0.41, "Buschmann, Dutkiewicz, Knoche 1982"],
  ["pyruvic acid", "CC(=O)C(=O)O", 0.19, "Pocker et al., J. Phys. Chem. 1969, 73, 2879"],
  ["2-oxobutanoic acid", "CCC(=O)C(=O)O", 0.23, "Buschmann, Füldner, Knoche 1980"],
  ["benzaldehyde", "O=Cc1ccccc1", -2.1, "McClelland, Coe 1983"],
  ["4-chlorobenzaldehyde", "O=Cc1ccc(Cl)cc1", -1.8, "McClelland, Coe 1983"],
  ["3-nitrobenzaldehyde", "O=Cc1cccc(c1)[N+](=O)[O-]", -0.96, "McClelland, Coe 1983"],
  ["4-nitrobenzaldehyde", "O=Cc1ccc(cc1)[N+](=O)[O-]", -0.77, "McClelland, Coe 1983"],
  ["3,5-dinitrobenzaldehyde", "O=Cc1cc(cc(c1)[N+](=O)[O-])[N+](=O)[O-]", 0.32, "McClelland, Coe 1983"],
  ["terephthalaldehyde", "O=Cc1ccc(C=O)cc1", -0.52, "Baymak, Vercoe, Zuman, J. Phys. Chem. B 2005, 109, 21928"],
  ["2-chloro-6-nitrobenzaldehyde", "O=Cc1c(Cl)cccc1[N+](=O)[O-]", -0.47, "Guthrie, J. Am. Chem. Soc. 2000, 122, 5529"],
];

function rms(values: readonly number[]): number {
  return Math.sqrt(values.reduce((sum, value) => sum + value * value, 0) / values.length);
}

describe("correlation alone, compounds that the regression never saw", () => {
  it.each(UNSEEN)("%s: within three standard deviations", (_, smiles, log10) => {
    const found = estimated(smiles);
    expect(found.method).toBe("correlated");
    expect(Math.abs(found.log10 - log10)).toBeLessThan(3 * found.sd);
  });

  it("has an RMSE below 0.35 and at least four fifths inside the 95 % interval", () => {
    const rows = UNSEEN.map(([, smiles, log10]) => ({ ...estimated(smiles), off: estimated(smiles).log10 - log10 }));
    expect(rms(rows.map((row) => row.off))).toBeLessThan(0.35);
    expect(rows.filter((row) => Math.abs(row.off) <= 1.96 * row.sd).length / rows.length).toBeGreaterThan(0.8);
  });
});

describe("correlation alone, compounds of the regression", () => {
  it.each(SEEN)("%s: within three standard deviations", (_, smiles, log10) => {
    const found = estimated(smiles);
    expect(found.method).toBe("correlated");
    expect(Math.abs(found.log10 - log10)).toBeLessThan(3 * found.sd);
  });
});

describe("facts of the trade (common practice, no source)", () => {
  it("formaldehyde, acetaldehyde, acetone and hexafluoroacetone stand where every textbook has them", () => {
    const fraction = (smiles: string): number => {
      const k = 10 ** estimated(smiles, { measured: true }).log10;
      return k / (1 + k);
    };
    expect(fraction("C=O")).toBeGreaterThan(0.999);
    expect(fraction("CC=O")).toBeGreaterThan(0.48);
    expect(fraction("CC=O")).toBeLessThan(0.6);
    expect(fraction("CC(C)=O")).toBeGreaterThan(0.001);
    expect(fraction("CC(C)=O")).toBeLessThan(0.003);
    expect(fraction("O=C(C(F)(F)F)C(F)(F)F")).toBeGreaterThan(0.9999);
  });

  it("donors lower, acceptors raise, an aryl ring lowers, a second alkyl lowers", () => {
    const k = (smiles: string): number => estimated(smiles).log10;
    expect(k("COc1ccc(C=O)cc1")).toBeLessThan(k("Cc1ccc(C=O)cc1"));
    expect(k("Cc1ccc(C=O)cc1")).toBeLessThan(k("O=Cc1ccccc1"));
    expect(k("O=Cc1ccccc1")).toBeLessThan(k("O=Cc1ccc(C#N)cc1"));
    expect(k("O=Cc1ccccc1")).toBeLessThan(k("CC=O"));
    expect(k("CC(C)=O")).toBeLessThan(k("CC=O"));
    expect(k("CC=O")).toBeLessThan(k("O=CCCl"));
    expect(k("O=CCCl")).toBeLessThan(k("O=CC(Cl)Cl"));
    expect(k("C=CC=O")).toBeLessThan(k("CCC=O"));
  });
});

describe("other temperatures and states, from the constants at 25 °C", () => {
  it("formaldehyde at 40 and 60 °C (Winkelman et al., Chem. Eng. Sci. 2002, 57, 4067: 694, 337)", () => {
    for (const [celsius, k] of [
      [40, 694],
      [60, 337],
    ] as const) {
      const found = estimated("C=O", { celsius, measured: true });
      expect(Math.abs(found.log10 - Math.log10(k))).toBeLessThan(1.96 * found.sd);
    }
  });

  it("pyruvic acid at 0 °C: 82 % (Pocker et al. 1969)", () => {
    const found = estimated("CC(=O)C(=O)O", { celsius: 0, measured: true });
    expect(Math.abs(found.log10 - Math.log10(0.82 / 0.18))).toBeLessThan(1.96 * found.sd);
  });

  it("pyruvate, from the acid's correlation: 6 % at 25 °C (Pocker et al. 1969)", () => {
    const found = estimated("CC(=O)C(=O)O", { state: "anion" });
    expect(found.method).toBe("correlated");
    expect(Math.abs(found.log10 - Math.log10(0.06 / 0.94))).toBeLessThan(1.96 * found.sd);
  });

  it("acetaldehyde at 280 K: 1.7 (Nakazawa, Takahashi, Bull. Chem. Soc. Jpn. 1999, 72, 975, from their ΔH and ΔS)", () => {
    const found = estimated("CC=O", { celsius: 6.85, measured: true });
    expect(Math.abs(found.log10 - Math.log10(1.74))).toBeLessThan(1.96 * found.sd);
  });

  it("protonation raises pyridinecarbaldehydes (Cabani, Gianni, Matteoli, J. Phys. Chem. 1972, 76, 2959; recalled)", () => {
    for (const smiles of ["O=Cc1ccccn1", "O=Cc1cccnc1", "O=Cc1ccncc1"])
      expect(estimated(smiles, { state: "cation" }).log10).toBeGreaterThan(estimated(smiles).log10 + 0.8);
  });
});

describe("what correlation-only means", () => {
  it("gives the same answer however the compound is written, and never a measured one", () => {
    for (const [a, b] of [
      ["CC(=O)C(=O)O", "OC(=O)C(C)=O"],
      ["O=Cc1cccc(Cl)c1", "c1cc(C=O)cc(Cl)c1"],
      ["[13CH3]C=O", "CC=O"],
    ] as const) {
      expect(estimated(a).log10).toBeCloseTo(estimated(b).log10, 9);
      expect(estimated(a).method).toBe("correlated");
      expect(estimated(a, { measured: true }).method).toBe("measured");
    }
  });
});
