/** Masses, canonical structures and carbonyl sites against RDKit's WebAssembly build, a general-purpose toolkit (npm @rdkit/rdkit). */

import { createRequire } from "node:module";
import { beforeAll, describe, expect, it } from "vitest";
import { createStructureToolkit } from "../../../shared-lib/compounds/structure.ts";
import { measuredParents } from "../../../shared-lib/equilibrium/constants/measured.ts";

interface Other {
  get_mol(smiles: string): OtherMolecule | null;
  get_qmol(smarts: string): OtherMolecule;
}
interface OtherMolecule {
  get_smiles(options?: string): string;
  get_descriptors(): string;
  get_substruct_matches(query: OtherMolecule): string;
  delete(): void;
}

const STRUCTURES = [
  ...measuredParents("neutral"),
  ..."O=CC1CCCCC1 O=CC(Cc1ccccc1)NC(=O)OC(C)(C)C O=Cc1ccc2OCOc2c1 O=C1CC[NH2+]CC1 O=C(C=Cc1ccccc1)c1ccccc1 O=CCP(=O)(OC)OC O=CC1OCCO1 CC(=O)OC(C)=O O=C1CCCO1 NC(N)=O CN(C)C=O O=C1C=CC(=O)C=C1 CC(=O)Cl CC(=S)C COC(=O)CC(C)=O OCC(O)C(O)C(O)C(O)C=O CC12CCC3C(CCC4=CC(=O)CCC34C)C1CCC2=O O=Cc1c[nH]c2ccccc12 O=C1C(=O)c2ccccc2C1=O CC(=O)C(=O)[O-] O=Cc1cc[nH+]cc1 O=CCOP(=O)(O)O O=C(C(F)(F)F)c1ccccc1 O=CC#C CC(C)=CCCC(C)=CC=O".split(
    " ",
  ),
];

/** An aldehyde or ketone C=O, quinones left out: written for the other toolkit's pattern language. */
const SITE = "[$([#6X3H2]=[OX1]),$([#6X3H1](=[OX1])[#6]),$([#6X3H0](=[OX1])([#6])[#6])]";
const QUINONE = "O=C1C=CC(=O)C=C1";

let other: Other;
const toolkit = createStructureToolkit();

beforeAll(async () => {
  const load = createRequire(import.meta.url)("@rdkit/rdkit") as () => Promise<Other>;
  other = await load();
});

describe("against another toolkit", () => {
  it("agrees on molar masses within 0.02 g/mol", () => {
    for (const smiles of STRUCTURES) {
      const molecule = other.get_mol(smiles) as OtherMolecule;
      const reading = toolkit.read(smiles);
      const mass = (JSON.parse(molecule.get_descriptors()) as { amw: number }).amw;
      expect(reading.ok, smiles).toBe(true);
      if (reading.ok) expect(Math.abs(reading.molarMass - mass), smiles).toBeLessThan(0.02);
      molecule.delete();
    }
  });

  it("finds the same carbonyl sites", () => {
    const pattern = other.get_qmol(SITE);
    for (const smiles of STRUCTURES) {
      if (smiles === QUINONE) continue;
      const reading = toolkit.read(smiles);
      if (!reading.ok) throw new Error(smiles);
      // Atoms are counted in the SMILES that the toolkit gives out.
      const molecule = other.get_mol(reading.canonicalSmiles) as OtherMolecule;
      const matches = JSON.parse(molecule.get_substruct_matches(pattern)) as { atoms?: number[] }[];
      const expected = (Array.isArray(matches) ? matches : [])
        .flatMap((match) => match.atoms ?? [])
        .sort((a, b) => a - b);
      const found = (reading.carbonyl?.sites.map((site) => site.atom) ?? []).sort((a, b) => a - b);
      expect(found, smiles).toEqual(expected);
      molecule.delete();
    }
  });

  it("gives one canonical structure and the same descriptors whatever the order of the atoms", () => {
    for (const smiles of STRUCTURES) {
      const own = toolkit.read(smiles);
      const molecule = other.get_mol(smiles) as OtherMolecule;
      for (let k = 0; k < 3; k++) {
        const shuffled = molecule.get_smiles(JSON.stringify({ doRandom: true }));
        const reading = toolkit.read(shuffled);
        const place = `${smiles} written ${shuffled}`;
        if (!own.ok || !reading.ok) throw new Error(place);
        expect(reading.canonicalSmiles, place).toBe(own.canonicalSmiles);
        const sums = (of: typeof own): number[] =>
          (of.carbonyl?.sites ?? [])
            .map((site) => Number((site.sigmaStar + (site.aryl?.sigmaPlus ?? 0)).toFixed(6)))
            .sort();
        expect(sums(reading), place).toEqual(sums(own));
        expect(reading.carbonyl?.sites[0]?.parent, place).toBe(own.carbonyl?.sites[0]?.parent);
      }
      molecule.delete();
    }
  });
});
