/** The ring that a hydroxyl of the molecule can close on a carbonyl carbon. */

import { atomAt, hasOxo, type MoleculeGraph } from "./graph.ts";

export interface Closure {
  /** The hydroxyl oxygen. */
  readonly atom: number;
  readonly ringSize: 5 | 6 | 7;
}

/** Five- and six-membered rings first: a seven-membered one forms only where nothing better can. */
const PREFERENCE: readonly (5 | 6 | 7)[] = [6, 5, 7];

interface Step {
  readonly steps: number;
  /** Atoms between, the carbonyl carbon first. */
  readonly path: readonly number[];
}

/** Shortest paths from `from` to everything within `most` bonds. */
function reachOf(graph: MoleculeGraph, from: number, most: number): ReadonlyMap<number, Step> {
  const found = new Map<number, Step>([[from, { steps: 0, path: [from] }]]);
  const queue = [from];
  for (let head = 0; head < queue.length; head++) {
    const here = queue[head] as number;
    const { steps, path } = found.get(here) as Step;
    if (steps >= most) continue;
    for (const bond of atomAt(graph, here).neighbours) {
      if (found.has(bond.atom)) continue;
      found.set(bond.atom, { steps: steps + 1, path: [...path, bond.atom] });
      queue.push(bond.atom);
    }
  }
  return found;
}

/**
 * Whether the chain between can bend into a ring: an aromatic ring only at ortho places, no open-chain double bond (its geometry is
 * mostly trans), no triple bond, and not across the ring that holds both ends.
 */
function canBend(graph: MoleculeGraph, path: readonly number[]): boolean {
  for (const ring of graph.rings) {
    const inRing = path.filter((atom) => ring.atoms.includes(atom)).length;
    if (inRing > (ring.aromatic ? 2 : 3)) return false;
  }
  for (let i = 1; i + 1 < path.length; i++) {
    const bond = atomAt(graph, path[i] as number).neighbours.find((other) => other.atom === path[i + 1]);
    if (bond && (bond.order === 3 || (bond.order === 2 && !bond.inRing))) return false;
  }
  return true;
}

/** An alcohol's O: on an sp3 carbon, neutral, with an H. Phenols and acids close no stable hemiacetal. */
function isAlcoholOxygen(graph: MoleculeGraph, index: number): boolean {
  const atom = atomAt(graph, index);
  const carrier = atom.neighbours[0];
  if (atom.element !== "O" || atom.hydrogens === 0 || atom.charge !== 0 || !carrier) return false;
  const carbon = atomAt(graph, carrier.atom);
  return carbon.element === "C" && !carbon.aromatic && !hasOxo(graph, carrier.atom);
}

/** The hydroxyl that closes the best ring of 5, 6 or 7 members on the carbonyl carbon, or undefined. */
export function findClosure(graph: MoleculeGraph, carbonyl: number): Closure | undefined {
  const bySize = new Map<number, number>();
  for (const [index, { steps, path }] of reachOf(graph, carbonyl, 6))
    if (!bySize.has(steps + 1) && isAlcoholOxygen(graph, index) && canBend(graph, path)) bySize.set(steps + 1, index);
  for (const ringSize of PREFERENCE) {
    const oxygen = bySize.get(ringSize);
    if (oxygen !== undefined) return { atom: oxygen, ringSize };
  }
  return undefined;
}
