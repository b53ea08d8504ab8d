/** The ring that a hydroxyl of the molecule can close on a carbonyl carbon. */

import { atomAt, hasOxo, type MoleculeGraph } from "./graph.ts";

export interface Closure {
  /** The hydroxyl oxygen. */
  readonly atom: number;
  readonly ringSize: 5 | 6 | 7;
}

/** Five- and six-membered rings first: a seven-membered one forms only where nothing better can. */
const PREFERENCE: readonly (5 | 6 | 7)[] = [6, 5, 7];

/** Rigid spacers keep an OH away: a ring or double bond in the path allows it only for cis places, so aromatic paths must be ortho. */
function distances(graph: MoleculeGraph, from: number, most: number): Map<number, number> {
  const found = new Map([[from, 0]]);
  const queue = [from];
  for (let head = 0; head < queue.length; head++) {
    const here = queue[head] as number;
    const steps = found.get(here) as number;
    if (steps >= most) continue;
    for (const bond of atomAt(graph, here).neighbours) {
      if (found.has(bond.atom)) continue;
      found.set(bond.atom, steps + 1);
      queue.push(bond.atom);
    }
  }
  return found;
}

/** An alcohol OH whose oxygen stands 4, 5 or 6 bonds from the carbonyl carbon; phenols and acids close no stable hemiacetal. */
export function findClosure(graph: MoleculeGraph, carbonyl: number): Closure | undefined {
  const reach = distances(graph, carbonyl, 6);
  const bySize = new Map<number, number>();
  for (const [index, steps] of reach) {
    const atom = atomAt(graph, index);
    if (atom.element !== "O" || atom.hydrogens === 0 || atom.charge !== 0) continue;
    const carrier = atom.neighbours[0];
    if (
      !carrier ||
      hasOxo(graph, carrier.atom) ||
      atomAt(graph, carrier.atom).aromatic ||
      atomAt(graph, carrier.atom).element !== "C"
    )
      continue;
    const size = steps + 1;
    if (!bySize.has(size)) bySize.set(size, index);
  }
  for (const ringSize of PREFERENCE) {
    const oxygen = bySize.get(ringSize);
    if (oxygen !== undefined) return { atom: oxygen, ringSize };
  }
  return undefined;
}
