import { describe, expect, it } from "vitest";
import { createStructureToolkit } from "../../shared-lib/compounds/structure.ts";
import { allBuffers, bufferByKey, bufferPH, usualPH } from "../../shared-lib/media/buffers.ts";
import { allSalts } from "../../shared-lib/media/salts.ts";
import { allSolvents, densityAt, molesInVolume, solventByKey } from "../../shared-lib/media/solvents.ts";
import { allStockMedia, stockAmounts, stockMediumNamed } from "../../shared-lib/media/stock-media.ts";
import { hasGroups } from "../../shared-lib/media/unifac.ts";

/** The last digit of a CAS registry number: the sum of the others, each times its place from the right, modulo 10. */
function casIsRight(cas: string): boolean {
  const digits = cas.replaceAll("-", "");
  const sum = [...digits.slice(0, -1)].reverse().reduce((total, digit, i) => total + Number(digit) * (i + 1), 0);
  return sum % 10 === Number(digits.at(-1));
}

describe("solvents", () => {
  it("are 70 or more, each with a right CAS number, a structure and a source", () => {
    expect(allSolvents().length).toBeGreaterThanOrEqual(70);
    const toolkit = createStructureToolkit();
    for (const solvent of allSolvents()) {
      expect(casIsRight(solvent.cas), solvent.key).toBe(true);
      const structure = toolkit.read(solvent.smiles);
      expect(structure.ok && Math.abs(structure.molarMass - solvent.molarMass) < 0.01, solvent.key).toBe(true);
      expect(solvent.source, solvent.key).not.toBe("");
    }
  });

  it("have densities that stay plausible from −78 to 125 °C and never rise with temperature", () => {
    for (const solvent of allSolvents()) {
      expect(solvent.densitySlope, solvent.key).toBeLessThan(0);
      for (const kelvin of [195, 298, 398]) {
        expect(densityAt(solvent, kelvin), solvent.key).toBeGreaterThan(0.45);
        expect(densityAt(solvent, kelvin), solvent.key).toBeLessThan(2);
      }
    }
  });

  // Common practice, no source: neat water is 55.3 M, methanol 24.5 M, ethanol 17.0 M at 25 °C.
  it.each([
    ["water", 55.3],
    ["methanol", 24.55],
    ["ethanol", 17.04],
  ])("neat %s is %f M", (key, molar) => {
    const solvent = solventByKey(key);
    expect(solvent && molesInVolume(solvent, 1)).toBeCloseTo(molar, 1);
  });

  it("have an activity model, but for a few that the published groups do not cover", () => {
    const lacking = allSolvents()
      .filter((solvent) => !hasGroups(solvent.key))
      .map((solvent) => solvent.key);
    expect(lacking.sort()).toEqual(
      ["1,3-dioxolane", "DMPU", "HMPA", "allyl alcohol", "formamide", "propylene carbonate"].sort(),
    );
  });
});

describe("buffers", () => {
  it("are 60 or more, with as many slopes as fit and a range that is one", () => {
    expect(allBuffers().length).toBeGreaterThanOrEqual(60);
    for (const buffer of allBuffers()) {
      expect(buffer.slopes.length, buffer.key).toBeLessThanOrEqual(buffer.pKa.length);
      if (buffer.pHRange) expect(buffer.pHRange[0], buffer.key).toBeLessThanOrEqual(buffer.pHRange[1]);
      expect(buffer.source, buffer.key).not.toBe("");
    }
  });

  // Tris falls by 0.028 per kelvin (read in a buffer note): pH 8.0 set at 25 °C is 8.6 at 4 °C. Phosphate hardly moves.
  it("move with temperature as their pKa does", () => {
    const tris = bufferByKey("Tris");
    const phosphate = bufferByKey("phosphate");
    if (!tris || !phosphate) throw new Error("a buffer is missing");
    expect(bufferPH(tris, 277.15, 8)).toBeCloseTo(8.59, 2);
    expect(bufferPH(phosphate, 310.15, 7.4)).toBeCloseTo(7.37, 2);
    expect(bufferPH(phosphate, 310.15, 12)).toBeCloseTo(12 - 0.026 * 12, 2);
    expect(usualPH(phosphate, 298.15)).toBeCloseTo(6.9, 6);
    const thiols = bufferByKey("thiols");
    expect(thiols && usualPH(thiols, 298.15)).toBeUndefined();
  });
});

describe("salts and stock media", () => {
  it("have right CAS numbers and rising molalities", () => {
    for (const salt of allSalts()) {
      expect(casIsRight(salt.cas), salt.key).toBe(true);
      for (let i = 1; i < salt.osmotic.length; i++)
        expect(salt.osmotic[i]?.[0], salt.key).toBeGreaterThan(salt.osmotic[i - 1]?.[0] ?? 0);
    }
  });
  it("are found by name and give amounts", () => {
    const medium = stockMediumNamed("denatured EtOH");
    expect(medium?.key).toBe("denatured ethanol");
    const spirit = stockMediumNamed("95 % ETOH");
    const amounts = spirit ? stockAmounts(spirit, 100) : [];
    // 95 % by volume: mole fraction of water 0.173 (CRC Handbook densities, 20 °C).
    const total = amounts.reduce((sum, { amount }) => sum + amount, 0);
    expect((amounts.find(({ solvent }) => solvent === "water")?.amount ?? 0) / total).toBeCloseTo(0.173, 2);
    expect(stockMediumNamed("ethanol")).toBeUndefined();
  });
  it("name each thing once", () => {
    const names = allStockMedia().flatMap(({ key, synonyms }) => [
      ...new Set([key, ...synonyms].map((name) => name.toLowerCase().replaceAll(" ", ""))),
    ]);
    expect(new Set(names).size).toBe(names.length);
  });
});
