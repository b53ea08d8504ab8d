/** Classes, reasons and rings that perception names; the chemistry is common practice, no source. */

import { describe, expect, it } from "vitest";
import { createStructureToolkit } from "../../../shared-lib/compounds/structure.ts";

const toolkit = createStructureToolkit();

function classes(smiles: string): string[] | string {
  const reading = toolkit.read(smiles);
  if (!reading.ok) return reading.problem;
  return reading.outside ?? reading.carbonyl?.sites.map((site) => site.class) ?? [];
}

function onlySite(smiles: string) {
  const reading = toolkit.read(smiles);
  const site = reading.ok ? reading.carbonyl?.sites[0] : undefined;
  if (!site) throw new Error(`${smiles} has no site`);
  return site;
}

describe("classes of carbonyl sites", () => {
  it.each([
    ["C=O", "formaldehyde"],
    ["CCC=O", "aliphatic aldehyde"],
    ["O=CCCl", "alpha-hetero aldehyde"],
    ["O=CCS(=O)(=O)C", "alpha-hetero aldehyde"],
    ["C=CC=O", "enal"],
    ["C#CC=O", "ynal"],
    ["O=Cc1ccccc1", "aryl aldehyde"],
    ["O=Cc1ccccn1", "heteroaryl aldehyde"],
    ["O=CC(=O)O", "alpha-oxo aldehyde"],
    ["CC(C)=O", "ketone"],
    ["O=C1CCCCC1", "cyclic ketone"],
    ["C=CC(C)=O", "enone"],
    ["CC(=O)c1ccccc1", "aryl ketone"],
    ["O=C(c1ccccc1)c1ccccc1", "diaryl ketone"],
    ["CC(=O)C(F)(F)F", "trifluoromethyl ketone"],
    ["CC(=O)C(=O)O", "alpha-keto acid"],
    ["CC(=O)C(=O)OC", "alpha-keto ester"],
    ["CC(=O)C(N)=O", "alpha-keto amide"],
    ["COC(=O)C(=O)C(F)(F)F", "alpha-keto ester"],
    ["OCC(O)C(O)C(O)C(O)C=O", "sugar"],
  ])("%s is an %s", (smiles, expected) => {
    expect(classes(smiles)).toEqual([expected]);
  });

  it("gives each of unlike sites its own class, and says which takes the water first", () => {
    expect(classes("CC(=O)C=O")).toEqual(["vicinal diketone", "alpha-oxo aldehyde"]);
    const reading = toolkit.read("CC(=O)C=O");
    expect(reading.ok && reading.carbonyl?.sites.map((site) => site.leading)).toEqual([false, true]);
  });

  it.each([
    ["O=C1C=CC(=O)C=C1", "a quinone"],
    ["CC(=O)O", "a carboxylic acid"],
    ["CC(=O)OC", "an ester or anhydride"],
    ["O=C1CCCO1", "a lactone or cyclic anhydride"],
    ["NC(N)=O", "a urea"],
    ["COC(=O)OC", "a carbonate"],
    ["COC(N)=O", "a carbamate"],
    ["O=C1CCCN1", "an amide, lactam or imide"],
    ["CC(=O)Cl", "an acyl halide"],
    ["CC(=O)SC", "a thioester"],
    ["O=C1C=CC=CC=C1", "a tropone"],
  ])("%s is none: %s", (smiles, kind) => {
    expect(classes(smiles)).toBe(`the C=O is that of ${kind}`);
  });

  it("says what to write for a sugar in its ring form, and for two compounds in one SMILES", () => {
    expect(classes("OC1OC(CO)C(O)C(O)C1O")).toMatch(/write the open-chain/);
    expect(classes("OC(O)C(Cl)(Cl)Cl")).toMatch(/write the aldehyde or ketone itself/);
    expect(classes("OC(O)C(=O)O")).toMatch(/written as the hydrate/);
    expect(classes("CC=O.CC(C)=O")).toMatch(/one at a time/);
    expect(classes("[Fe+3].CC=O")).toMatch(/Fe/);
  });
});

describe("rings that a hydroxyl can close", () => {
  it.each([
    ["O=CCCCO", 5],
    ["O=CCCCCO", 6],
    ["O=Cc1ccccc1CO", 5],
    ["OCC(O)C(O)C(O)C(O)C=O", 6],
  ])("%s: %i members", (smiles, size) => {
    expect(onlySite(smiles).closure?.ringSize).toBe(size);
  });

  it.each([["O=Cc1ccc(CO)o1"], ["O=C1CCC(O)CC1"], ["O=CC=CCO"], ["O=Cc1ccccc1O"], ["CCC=O"]])("%s: none", (smiles) => {
    expect(onlySite(smiles).closure).toBeUndefined();
  });
});

describe("salts, isotopes and ions", () => {
  it("files a salt, a label and a stereoisomer under the compound itself", () => {
    const pyruvic = onlySite("CC(=O)C(=O)O").parent;
    expect(onlySite("CC(=O)C(=O)[O-].[Na+]").parent).toBe(pyruvic);
    expect(onlySite("CC(=O)C(=O)[O-].[Ca+2].CC(=O)C(=O)[O-]").parent).toBe(pyruvic);
    expect(onlySite("[13CH3]C(=O)C(=O)O").parent).toBe(pyruvic);
    expect(onlySite("OC[C@@H](O)C=O").parent).toBe(onlySite("OCC(O)C=O").parent);
  });

  it("draws products that read back: the diol holds one water more", () => {
    for (const smiles of ["CC=O", "O=Cc1ccccc1", "CC(=O)C(=O)O", "O=C1CCCCC1"]) {
      const free = toolkit.read(smiles);
      const diol = toolkit.read(onlySite(smiles).hydrateSmiles);
      expect(free.ok && diol.ok && diol.molarMass - free.molarMass).toBeCloseTo(18.015, 2);
    }
  });
});
