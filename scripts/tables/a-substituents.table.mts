/** σ* and Hammett constants by the signature of the group: perception reads these, so they are compiled before any structure is. */
import { Molecule } from "openchemlib";
import { atomAt, type GraphAtom, type MoleculeGraph } from "../../shared-lib/compounds/perception/graph.ts";
import { groupSignature } from "../../shared-lib/compounds/perception/signature.ts";
import type { CompileTables } from "../compile-tables.mts";
import { numberIn, optionalNumber, readTsv, type TableRow } from "./read-tsv.mts";

/** Not structure.ts: that reads the tables which this compiles. */
function graphOf(smiles: string): MoleculeGraph {
  const molecule = Molecule.fromSmiles(smiles, { noCoordinates: true });
  molecule.ensureHelperArrays(Molecule.cHelperRings);
  const atoms: GraphAtom[] = Array.from({ length: molecule.getAtoms() }, (_, i) => ({
    element: molecule.getAtomLabel(i),
    charge: molecule.getAtomCharge(i),
    hydrogens: molecule.getAllHydrogens(i),
    aromatic: molecule.isAromaticAtom(i),
    neighbours: Array.from({ length: molecule.getConnAtoms(i) }, (_, k) => ({
      atom: molecule.getConnAtom(i, k),
      order: molecule.getConnBondOrder(i, k),
      inRing: molecule.isRingBond(molecule.getConnBond(i, k)),
    })),
  }));
  const set = molecule.getRingSet();
  const rings = Array.from({ length: set.getSize() }, (_, r) => ({
    atoms: set.getRingAtoms(r),
    aromatic: set.isAromatic(r),
  }));
  return { atoms, rings };
}

/** The group of a row, whose fragment marks the bond to the rest of the molecule with [At]. */
function signatureOf(row: TableRow): string | undefined {
  const graph = graphOf(row.cells.fragment ?? "");
  const mark = graph.atoms.findIndex((atom) => atom.element === "At");
  const root = mark < 0 ? undefined : atomAt(graph, mark).neighbours[0]?.atom;
  if (root === undefined) throw new Error(`${row.place}: fragment must mark its bond with [At]`);
  return groupSignature(graph, root, mark);
}

export const compile: CompileTables = async () => {
  const taft: Record<string, number> = {};
  for (const row of await readTsv("shared-lib/constants/taft.tsv", [
    "group",
    "fragment",
    "sigma_star",
    "source",
    "read",
  ])) {
    const signature = signatureOf(row);
    // Small rings and cyclohexyl stand in the table for the fit of the attenuation; perception puts them together from parts.
    if (signature !== undefined) taft[signature] = numberIn(row, "sigma_star");
  }
  const hammett: Record<string, object> = {};
  for (const row of await readTsv("shared-lib/constants/hammett.tsv", ["group", "fragment", "sigma_m", "sigma_p"])) {
    const signature = signatureOf(row);
    if (signature === undefined) throw new Error(`${row.place}: the group is too large for a table of substituents`);
    const entry = {
      group: row.cells.group,
      m: numberIn(row, "sigma_m"),
      p: numberIn(row, "sigma_p"),
      mPlus: optionalNumber(row, "sigma_m_plus"),
      pPlus: optionalNumber(row, "sigma_p_plus"),
    };
    hammett[signature] = entry;
    // Also by name, for the nearest kin of a group that the table lacks.
    hammett[entry.group as string] = entry;
  }
  return { "taft.json": JSON.stringify(taft), "hammett.json": JSON.stringify(hammett) };
};
