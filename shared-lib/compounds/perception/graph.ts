/** A molecule as perception needs it: atoms in the order of the SMILES, heavy atoms only, aromatic bonds kekulised. */

export interface GraphAtom {
  readonly element: string;
  readonly charge: number;
  /** All H, explicit or not. */
  readonly hydrogens: number;
  readonly aromatic: boolean;
  readonly neighbours: readonly { readonly atom: number; readonly order: number; readonly inRing: boolean }[];
}

export interface MoleculeGraph {
  readonly atoms: readonly GraphAtom[];
  /** Smallest set of smallest rings, atoms in ring order. */
  readonly rings: readonly { readonly atoms: readonly number[]; readonly aromatic: boolean }[];
}

/** Atom of the graph; the index always comes from the graph itself. */
export function atomAt(graph: MoleculeGraph, index: number): GraphAtom {
  const atom = graph.atoms[index];
  if (!atom) throw new RangeError(`atom ${index} is not in the molecule`);
  return atom;
}

/** Neighbours of `index` other than `from`. */
export function othersOf(graph: MoleculeGraph, index: number, from: number): GraphAtom["neighbours"] {
  return atomAt(graph, index).neighbours.filter((bond) => bond.atom !== from);
}

/** Has a double bond to an uncharged O. */
export function hasOxo(graph: MoleculeGraph, index: number): boolean {
  return atomAt(graph, index).neighbours.some((bond) => {
    const other = atomAt(graph, bond.atom);
    return bond.order === 2 && other.element === "O" && other.charge === 0;
  });
}

/** Smallest ring that holds `index`, or undefined. */
export function smallestRing(graph: MoleculeGraph, index: number): MoleculeGraph["rings"][number] | undefined {
  let best: MoleculeGraph["rings"][number] | undefined;
  for (const ring of graph.rings)
    if (ring.atoms.includes(index) && (!best || ring.atoms.length < best.atoms.length)) best = ring;
  return best;
}

/** Atoms bonded, however remotely, to `start`: the fragment that holds it. */
export function fragmentOf(graph: MoleculeGraph, start: number): ReadonlySet<number> {
  const found = new Set([start]);
  for (const atom of found) for (const bond of atomAt(graph, atom).neighbours) found.add(bond.atom);
  return found;
}
