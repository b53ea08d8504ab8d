/** Strict reading: what is refused, where, and that nothing throws. The grammar is OpenSMILES. */

import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { createStructureToolkit } from "../../shared-lib/compounds/structure.ts";

const toolkit = createStructureToolkit();

describe("SMILES that cannot be", () => {
  it.each([
    ["", /empty/, 0],
    ["CC(C=O", /branch is not closed/, 2],
    ["CC=O)", /never opened/, 4],
    ["C1CC=O", /ring 1 is not closed/, 1],
    ["O=CC%99", /ring %99 is not closed/, 4],
    ["c1cccc1", /aromatic ring does not close/, 5],
    ["CC(C)(C)(C)C=O", /5 bonds/, 1],
    ["C=#C", /bond/, 2],
    ["C=C#C", /5 bonds/, 2],
    ["[999C]", /mass number 999/, 1],
    ["CC[Xx]=O", /names no element/, 2],
    ["[CH2]C=O", /radical/, 0],
    ["cc", /no ring/, 0],
    ["CC=O |", /not part of a SMILES/, 4],
    ["C()C=O", /empty branch/, 2],
  ])("refuses %j", (smiles, problem, at) => {
    const reading = toolkit.read(smiles);
    expect(reading.ok).toBe(false);
    if (!reading.ok) {
      expect(reading.problem).toMatch(problem);
      expect(reading.at).toBe(at);
    }
  });

  it("refuses more than 300 heavy atoms and reads 300", () => {
    expect(toolkit.read(`${"C".repeat(305)}=O`).ok).toBe(false);
    expect(toolkit.read(`${"C".repeat(299)}=O`).ok).toBe(true);
  });

  it("never throws, whatever the text, and answers within bounds", () => {
    const alphabet = fc.constantFrom(..."CNOcnos[]()=#12%@+-.HFClBr/\\ ".split(""), "[O-]", "C=O", "c1ccccc1");
    fc.assert(
      fc.property(fc.array(alphabet, { maxLength: 40 }), (parts) => {
        const text = parts.join("");
        const reading = toolkit.read(text);
        if (!reading.ok) return typeof reading.problem === "string" && reading.problem.length > 0;
        return (reading.carbonyl?.sites ?? []).every((site) => Number.isFinite(site.sigmaStar));
      }),
      { numRuns: 400 },
    );
  });

  it("draws in the colour of the text around", () => {
    const svg = toolkit.draw("CC(O)O", 200, 120);
    expect(svg).toContain("currentColor");
    expect(svg).not.toMatch(/rgb\(/);
    expect(toolkit.draw("C(", 200, 120)).toBeUndefined();
  });
});
