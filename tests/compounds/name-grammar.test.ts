import { describe, expect, it } from "vitest";
import { readName } from "../../shared-lib/compounds/name-grammar/read-name.ts";
import { createStructureToolkit } from "../../shared-lib/compounds/structure.ts";
import carbonyls from "../../shared-lib/generated/compounds.json" with { type: "json" };

const structures = createStructureToolkit();

function canonical(smiles: string): string | undefined {
  const reading = structures.read(smiles);
  return reading.ok ? reading.canonicalSmiles : undefined;
}

describe("the name grammar", () => {
  // Two ways to one structure: the catalogue's SMILES were written by hand from the names, the grammar builds its own.
  it("agrees with the catalogue on every systematic name that both read", () => {
    const rows = carbonyls as unknown as { compound: { smiles: string; tags: string[] }; names: string[] }[];
    const differ: string[] = [];
    let read = 0;
    for (const { compound, names } of rows) {
      for (const name of names) {
        const smiles = readName(name);
        if (smiles === undefined) continue;
        read++;
        if (canonical(smiles) !== canonical(compound.smiles))
          differ.push(`${name}: ${smiles} against ${compound.smiles}`);
      }
    }
    expect(differ).toEqual([]);
    expect(read).toBeGreaterThan(200);
  });

  // Structures by the IUPAC rules of substitutive nomenclature (2013 recommendations), written by hand.
  it.each([
    ["5-nitropyridine-2-carbaldehyde", "O=Cc1ccc(cn1)[N+](=O)[O-]"],
    ["4-(benzyloxy)-3-methoxybenzaldehyde", "COc1cc(C=O)ccc1OCc1ccccc1"],
    ["(2E)-hex-2-enal", "CCCC=CC=O"],
    ["3,4-dihydronaphthalen-1(2H)-one", "O=C1CCCc2ccccc12"],
    ["ethyl 2-oxocyclopentanecarboxylate", "CCOC(=O)C1CCCC1=O"],
    ["tert-butyl 4-oxopiperidine-1-carboxylate", "CC(C)(C)OC(=O)N1CCC(=O)CC1"],
    ["1-methyl-1H-imidazole-2-carbaldehyde", "Cn1ccnc1C=O"],
    ["phenanthrene-1-carbaldehyde", "O=Cc1cccc2c1ccc1ccccc12"],
    ["phenanthrene-9-carbaldehyde", "O=Cc1cc2ccccc2c2ccccc12"],
    ["4-(phenylsulfonyl)benzaldehyde", "O=Cc1ccc(cc1)S(=O)(=O)c1ccccc1"],
  ])("reads %s", (name, smiles) => {
    expect(canonical(readName(name) ?? "")).toBe(canonical(smiles));
  });

  it.each([
    "total",
    "alone",
    "4-nitrobenzaldehyd",
    "2,2,2-benzaldehyde",
    "chlorobenzaldehyde",
    "4-carbonylbenzaldehyde",
    "5,6-dihydro-2H-pyran-3-carbaldehyde",
    "3-(toluenesulfonyl)benzaldehyde",
    "((((((((",
  ])("leaves %s alone", (name) => {
    expect(readName(name)).toBeUndefined();
  });
});
