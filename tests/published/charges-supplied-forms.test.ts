/** Worked figures of supplied forms against handbooks and formulas; the source stands beside each. */

import { describe, expect, it } from "vitest";
import { analyse } from "../advice/analyse.ts";

/** mol in a charge that is written only by what is weighed. */
function molIn(charge: string): { value: number; low: number; high: number } {
  const total = analyse(`${charge} was stirred in water (1 L).`).charges[0]?.total;
  if (!total) throw new Error(`no amount follows from "${charge}"`);
  return total;
}

describe("solutions by volume", () => {
  it("formalin is 12 to 13.4 mol/L", () => {
    // 36.5-38 wt% at 1.08-1.09 g/mL (trade specification; USP: not less than 34.5 wt%): 13.1 to 13.8; published molarities 12.3 to 13.4.
    const { value, low, high } = molIn("Formalin (1.00 L)");
    expect(value).toBeGreaterThan(12.3);
    expect(value).toBeLessThan(13.6);
    expect(low).toBeLessThan(13.4);
    expect(high).toBeGreaterThan(13.4);
  });

  it("40 wt% glyoxal is 8.8 mol/L", () => {
    // Supplier's safety sheet: 40 % glyoxal, 60 % water; density 1.265: 1265 × 0.40 / 58.04 = 8.72; the trade says 8.8 M.
    const { value, low, high } = molIn("Glyoxal (40 wt% in water, 1.00 L)");
    expect(Math.abs(value - 8.8)).toBeLessThan(0.2);
    expect(low).toBeLessThan(8.8);
    expect(high).toBeGreaterThan(8.8);
  });

  it("25 wt% glutaraldehyde is about 2.65 mol/L and 50 wt% about 5.6 mol/L", () => {
    // Common practice, no source: 1.06 g/mL and 1.106 to 1.13 g/mL at 20 °C.
    expect(Math.abs(molIn("Glutaraldehyde (25 wt% in water, 1.00 L)").value - 2.65)).toBeLessThan(0.05);
    expect(Math.abs(molIn("Glutaraldehyde (50 wt% in water, 1.00 L)").value - 5.6)).toBeLessThan(0.15);
  });

  it("50 wt% glyoxylic acid is about 9.1 mol/L", () => {
    // Chemical dictionary: 50 % aqueous solution of 1.342 g/cm3 at 20 °C: 1342 × 0.50 / 74.04 = 9.06.
    expect(Math.abs(molIn("50 wt% aqueous glyoxylic acid (1.00 L)").value - 9.06)).toBeLessThan(0.1);
  });
});

describe("solids by mass (molar masses from formulas, IUPAC atomic masses)", () => {
  it("chloral hydrate weighs 1.122 times as much as chloral", () => {
    // C2H3Cl3O2 165.40 over C2HCl3O 147.39. The note's own 100 mmol stand; the other mass is found out.
    const right = analyse("Chloral hydrate (16.54 g, 100 mmol) was stirred in water (1 L).");
    expect(right.findings.filter(({ code }) => code.startsWith("charge/"))).toEqual([]);
    const wrong = analyse("Chloral hydrate (14.74 g, 100 mmol) was stirred in water (1 L).");
    const found = wrong.findings.find(({ code }) => code === "charge/weighed-as-another-form");
    const mass = Number(found?.fixes[0]?.edits[0]?.text);
    expect(Math.abs(mass / 14.74 / (165.4 / 147.39) - 1)).toBeLessThan(0.03);
  });

  it("glyoxylic acid monohydrate weighs 1.243 times as much as glyoxylic acid", () => {
    // C2H4O4 92.05 over C2H2O3 74.04.
    const wrong = analyse("Glyoxylic acid monohydrate (7.40 g, 100 mmol) was stirred in water (1 L).");
    const found = wrong.findings.find(({ code }) => code === "charge/weighed-as-another-form");
    const mass = Number(found?.fixes[0]?.edits[0]?.text);
    expect(Math.abs(mass / 7.404 / (92.05 / 74.04) - 1)).toBeLessThan(0.03);
  });

  it("paraformaldehyde of 91 to 99 % holds 30.3 to 33.0 mmol of formaldehyde in a gram", () => {
    // Common practice, no source (assay); CH2O 30.03.
    const { value, low, high } = molIn("Paraformaldehyde (1.00 g)");
    expect(value * 1000).toBeGreaterThan(30.3);
    expect(value * 1000).toBeLessThan(33.0);
    expect(low * 1000).toBeCloseTo(30.3, 0);
    expect(high * 1000).toBeCloseTo(33.0, 0);
  });
});

describe("water that comes in", () => {
  it("one mol of a monohydrate brings one mol of water", () => {
    const { charges } = analyse("Glyoxylic acid monohydrate (92.05 g, 1.00 mol) was stirred in THF (1 L).");
    const water = charges[0]?.brings.find(({ solvent }) => solvent === "water")?.amount ?? 0;
    expect(water).toBeGreaterThan(0.97);
    expect(water).toBeLessThan(1.15);
  });

  it("a litre of formalin brings 9 to 15 wt% of methanol", () => {
    // USP, formaldehyde solution: 9.0 to 15.0 % methanol.
    const { charges } = analyse("Formalin (1.00 L) was stirred in THF (1 L).");
    const methanol = charges[0]?.brings.find(({ solvent }) => solvent === "methanol")?.amount ?? 0;
    const share = (methanol * 32.04) / 1090;
    expect(share).toBeGreaterThan(0.09);
    expect(share).toBeLessThan(0.15);
  });
});
