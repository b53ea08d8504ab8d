/** Putting pieces together: a group on an atom, a suffix on a parent, hydrogens on a ring. */

import type { Molecule } from "./molecule.ts";
import type { Piece } from "./tables.ts";

/** A group ready to be hung on: its first atom carries the bond. */
export interface Group {
  readonly molecule: Molecule;
  readonly order: 1 | 2;
  /** Locants of its atoms, and where an unlocanted prefix goes. */
  readonly locants: ReadonlyMap<string, number>;
  readonly free?: number;
  /** Atom that carries the bond. */
  readonly attach: number;
}

export function groupOf(piece: Piece): Group {
  return {
    molecule: piece.molecule,
    order: piece.order,
    locants: piece.locants,
    attach: 0,
    ...(piece.free === undefined ? {} : { free: piece.free }),
  };
}

/** Hangs `group` on `atom` of `molecule` (changed in place). */
export function hang(molecule: Molecule, atom: number, group: Group): void {
  const offset = molecule.absorb(group.molecule);
  molecule.addBond(atom, group.attach + offset, group.order);
}

/** A copy of `base` with `count` times `group` on its free atom; undefined without one. */
export function onFree(base: Group, group: Group, count: number): Group | undefined {
  if (base.free === undefined) return undefined;
  const molecule = base.molecule.copy();
  const offset = molecule.atoms.length;
  for (let i = 0; i < count; i++) hang(molecule, base.free, group);
  // "3-bromopropyloxy", "4-chlorophenylthio": the numbers are those of the inner group, for the joining one has none of its own.
  const inner = count === 1 && base.locants.size <= 1;
  const locants = inner ? new Map([...group.locants].map(([locant, atom]) => [locant, atom + offset])) : base.locants;
  return { ...base, molecule, locants };
}

/**
 * Adds hydrogen: the atoms become saturated, and what is left of an aromatic ring gets its double bonds back.
 *
 * @returns false when the positions leave no sensible ring
 */
export function saturate(molecule: Molecule, atoms: readonly number[]): boolean {
  const left = new Set(atoms);
  for (const atom of left) {
    const own = molecule.atoms[atom];
    if (!own) return false;
    own.aromatic = false;
  }
  // A double bond between two saturated atoms is gone.
  for (const bond of molecule.bonds) if (left.has(bond.a) && left.has(bond.b) && bond.order === 2) bond.order = 1;
  // One end of a double bond cannot be hydrogenated alone: the name means another ring.
  if (
    molecule.bonds.some(
      (bond) => bond.order === 2 && left.has(bond.a) !== left.has(bond.b) && bothCarbon(molecule, bond.a, bond.b),
    )
  )
    return false;
  // Aromatic atoms whose ring was opened by this keep one double bond with a neighbour in the same state.
  const rings = aromaticRings(molecule);
  const whole = new Set(rings.flat());
  const loose = molecule.atoms.flatMap((atom, index) => (atom.aromatic && !whole.has(index) ? [index] : []));
  for (const index of loose) (molecule.atoms[index] as { aromatic: boolean }).aromatic = false;
  const open = new Set(
    loose.filter(
      (index) =>
        molecule.atoms[index]?.element === "C" ||
        (molecule.atoms[index]?.element === "N" && molecule.neighbours(index).length === 2),
    ),
  );
  for (const index of loose) {
    if (!open.has(index)) continue;
    const partner = molecule.neighbours(index).find(({ atom }) => open.has(atom));
    if (!partner) {
      if (molecule.atoms[index]?.element === "N") continue;
      return false;
    }
    partner.bond.order = 2;
    open.delete(index);
    open.delete(partner.atom);
  }
  return true;
}

function bothCarbon(molecule: Molecule, a: number, b: number): boolean {
  return molecule.atoms[a]?.element === "C" && molecule.atoms[b]?.element === "C";
}

/** Five- and six-membered rings whose atoms are all marked aromatic. */
function aromaticRings(molecule: Molecule): number[][] {
  const rings = new Map<string, number[]>();
  const walk = (path: number[]): void => {
    for (const { atom } of molecule.neighbours(path.at(-1) as number)) {
      if (path.length >= 5 && atom === path[0]) rings.set([...path].sort((a, b) => a - b).join(), [...path]);
      else if (path.length < 6 && !path.includes(atom) && molecule.atoms[atom]?.aromatic) walk([...path, atom]);
    }
  };
  molecule.atoms.forEach((atom, index) => {
    if (atom.aromatic) walk([index]);
  });
  return [...rings.values()];
}
