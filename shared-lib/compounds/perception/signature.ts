/** A text that two substituents share exactly when they are the same group (stereo aside). */

import { atomAt, type MoleculeGraph, othersOf } from "./graph.ts";

/** Larger groups are never in a table of substituents: the walk stops there. */
const MOST_ATOMS = 12;

/** The unsubstituted six-membered carbon ring, the one cyclic group that tables of substituents hold. */
function isPhenyl(graph: MoleculeGraph, index: number, from: number): boolean {
  const ring = graph.rings.find((candidate) => candidate.atoms.includes(index));
  if (!ring?.aromatic || ring.atoms.length !== 6 || ring.atoms.includes(from)) return false;
  return ring.atoms.every((member) => {
    const atom = atomAt(graph, member);
    return atom.element === "C" && (member === index ? atom.neighbours.length === 3 : atom.neighbours.length === 2);
  });
}

/**
 * Signature of the group that hangs on `from` by its atom `index`.
 *
 * @returns undefined for a group with a ring (other than phenyl at its end) or with more than 12 heavy atoms
 */
export function groupSignature(graph: MoleculeGraph, index: number, from: number): string | undefined {
  const budget = { left: MOST_ATOMS };
  const visit = (atom: number, parent: number): string | undefined => {
    if (isPhenyl(graph, atom, parent)) return "Ph";
    if (othersOf(graph, atom, parent).some((bond) => bond.inRing)) return undefined;
    if (--budget.left < 0) return undefined;
    const here = atomAt(graph, atom);
    const parts: string[] = [];
    for (const bond of othersOf(graph, atom, parent)) {
      const part = visit(bond.atom, atom);
      if (part === undefined) return undefined;
      parts.push(`${bond.order}${part}`);
    }
    const charge = here.charge === 0 ? "" : here.charge > 0 ? "+" : "-";
    return `${here.element}${charge}h${here.hydrogens}(${parts.sort().join(",")})`;
  };
  return visit(index, from);
}
