/** A molecule as names build it: atoms and bonds, read from the tables' fragments and written as SMILES. No stereo, no coordinates. */

export interface NameAtom {
  readonly element: string;
  readonly charge: number;
  aromatic: boolean;
}

export interface NameBond {
  readonly a: number;
  readonly b: number;
  order: 1 | 2 | 3;
}

export class Molecule {
  readonly atoms: NameAtom[] = [];
  readonly bonds: NameBond[] = [];

  addAtom(element: string, aromatic = false, charge = 0): number {
    this.atoms.push({ element, aromatic, charge });
    return this.atoms.length - 1;
  }

  addBond(a: number, b: number, order: 1 | 2 | 3 = 1): void {
    this.bonds.push({ a, b, order });
  }

  /** Takes over all atoms of `other`; its atom i becomes i + the returned offset. */
  absorb(other: Molecule): number {
    const offset = this.atoms.length;
    for (const atom of other.atoms) this.atoms.push({ ...atom });
    for (const bond of other.bonds) this.bonds.push({ a: bond.a + offset, b: bond.b + offset, order: bond.order });
    return offset;
  }

  copy(): Molecule {
    const twin = new Molecule();
    twin.absorb(this);
    return twin;
  }

  neighbours(index: number): { readonly atom: number; readonly bond: NameBond }[] {
    return this.bonds.flatMap((bond) =>
      bond.a === index ? [{ atom: bond.b, bond }] : bond.b === index ? [{ atom: bond.a, bond }] : [],
    );
  }

  bondBetween(a: number, b: number): NameBond | undefined {
    return this.bonds.find((bond) => (bond.a === a && bond.b === b) || (bond.a === b && bond.b === a));
  }
}

const TWO_LETTERS = new Set(["Cl", "Br", "Si"]);
const ORDERS: Readonly<Record<string, 1 | 2 | 3>> = { "-": 1, "=": 2, "#": 3 };

/** Reads the fragments of the tables: organic atoms, brackets with a charge, branches, ring digits. @throws for anything else */
export function readFragment(smiles: string): Molecule {
  const molecule = new Molecule();
  const stack: number[] = [];
  const rings = new Map<string, { atom: number; order: 1 | 2 | 3 }>();
  let last = -1;
  let order: 1 | 2 | 3 = 1;
  const place = (atom: number): void => {
    if (last >= 0) molecule.addBond(last, atom, order);
    last = atom;
    order = 1;
  };
  for (let i = 0; i < smiles.length; i++) {
    const c = smiles[i] as string;
    if (c === "(") stack.push(last);
    else if (c === ")") last = stack.pop() ?? -1;
    else if (ORDERS[c]) order = ORDERS[c] as 1 | 2 | 3;
    else if (c >= "0" && c <= "9") {
      const open = rings.get(c);
      if (open) {
        molecule.addBond(open.atom, last, order === 1 ? open.order : order);
        rings.delete(c);
      } else rings.set(c, { atom: last, order });
      order = 1;
    } else if (c === "[") {
      const close = smiles.indexOf("]", i);
      const body = smiles.slice(i + 1, close);
      const symbol = /^[A-Z][a-z]?|^[a-z]/.exec(body)?.[0] ?? "";
      const element = symbol.length === 2 && !TWO_LETTERS.has(symbol) ? (symbol[0] as string) : symbol;
      place(
        molecule.addAtom(
          element.toUpperCase() === element || TWO_LETTERS.has(element) ? element : element.toUpperCase(),
          element.toLowerCase() === element,
          body.endsWith("+") ? 1 : body.endsWith("-") ? -1 : 0,
        ),
      );
      i = close;
    } else if (TWO_LETTERS.has(smiles.slice(i, i + 2))) {
      place(molecule.addAtom(smiles.slice(i, i + 2)));
      i++;
    } else if (/[BCNOPSFI]/.test(c)) place(molecule.addAtom(c));
    else if (/[bcnops]/.test(c)) place(molecule.addAtom(c.toUpperCase(), true));
    else throw new Error(`fragment ${smiles}: "${c}" is not part of the notation of the tables`);
  }
  return molecule;
}

const ORGANIC = new Set(["B", "C", "N", "O", "P", "S", "F", "Cl", "Br", "I"]);

function atomText(molecule: Molecule, index: number): string {
  const atom = molecule.atoms[index] as NameAtom;
  const { element, charge, aromatic } = atom;
  if (charge !== 0) return `[${aromatic ? element.toLowerCase() : element}${charge > 0 ? "+" : "-"}]`;
  if (!aromatic) return ORGANIC.has(element) ? element : `[${element}]`;
  // A five-ring nitrogen that carries nothing holds a hydrogen; one in a six-ring does not.
  if (element === "N" && needsHydrogen(molecule, index)) return "[nH]";
  return element.toLowerCase();
}

/** Rings of aromatic atoms are filed with their pyrrole-type N first marked: it has no substituent left. */
function needsHydrogen(molecule: Molecule, index: number): boolean {
  return pyrroleNitrogens(molecule).has(index);
}

/**
 * Pyrrole-type nitrogens without a substituent: in each five-membered aromatic ring that has no O, S or substituted N to give two electrons,
 * the first such N.
 */
function pyrroleNitrogens(molecule: Molecule): ReadonlySet<number> {
  const found = new Set<number>();
  for (const ring of fiveRings(molecule)) {
    const atoms = ring.map((index) => molecule.atoms[index] as NameAtom);
    if (!atoms.every((atom) => atom.aromatic)) continue;
    const donates = ring.some((index, i) => {
      const element = atoms[i]?.element;
      return (
        element === "O" ||
        element === "S" ||
        (element === "N" && molecule.neighbours(index).length > 2) ||
        found.has(index)
      );
    });
    if (donates) continue;
    const first = ring.filter((index) => molecule.atoms[index]?.element === "N").sort((a, b) => a - b)[0];
    if (first !== undefined) found.add(first);
  }
  return found;
}

function fiveRings(molecule: Molecule): number[][] {
  const rings = new Map<string, number[]>();
  const walk = (path: number[]): void => {
    const last = path.at(-1) as number;
    for (const { atom } of molecule.neighbours(last)) {
      if (path.length === 5 && atom === path[0]) rings.set([...path].sort((a, b) => a - b).join(), [...path]);
      else if (path.length < 5 && !path.includes(atom) && molecule.atoms[atom]?.aromatic) walk([...path, atom]);
    }
  };
  molecule.atoms.forEach((atom, index) => {
    if (atom.aromatic) walk([index]);
  });
  return [...rings.values()];
}

const BOND_TEXT = { 1: "", 2: "=", 3: "#" } as const;

/** SMILES of a molecule in one piece. */
export function writeSmiles(molecule: Molecule): string {
  const closures = new Map<number, { label: number; text: string }[]>();
  const seen = new Set<number>();
  const treeBonds = new Set<NameBond>();
  // First walk: which bonds close rings.
  const plan = (start: number): void => {
    const stack = [start];
    seen.add(start);
    const order: number[] = [];
    while (stack.length > 0) {
      const index = stack.pop() as number;
      order.push(index);
      for (const { atom, bond } of molecule.neighbours(index)) {
        if (seen.has(atom)) continue;
        seen.add(atom);
        treeBonds.add(bond);
        stack.push(atom);
      }
    }
  };
  plan(0);
  let label = 0;
  for (const bond of molecule.bonds) {
    if (treeBonds.has(bond)) continue;
    label++;
    const bothAromatic = molecule.atoms[bond.a]?.aromatic && molecule.atoms[bond.b]?.aromatic;
    const text = `${bothAromatic ? "" : BOND_TEXT[bond.order]}${label > 9 ? `%${label}` : label}`;
    for (const end of [bond.a, bond.b]) closures.set(end, [...(closures.get(end) ?? []), { label, text }]);
  }
  const write = (index: number, from: number): string => {
    const ringText = (closures.get(index) ?? []).map((closure) => closure.text).join("");
    const branches = molecule.neighbours(index).filter(({ atom, bond }) => treeBonds.has(bond) && atom !== from);
    const texts = branches.map(({ atom, bond }) => {
      const both = molecule.atoms[index]?.aromatic && molecule.atoms[atom]?.aromatic;
      const joint =
        both && bond.order === 1 && !inSameRing(molecule, index, atom) ? "-" : both ? "" : BOND_TEXT[bond.order];
      return `${joint}${write(atom, index)}`;
    });
    return `${atomText(molecule, index)}${ringText}${texts.map((text, i) => (i < texts.length - 1 ? `(${text})` : text)).join("")}`;
  };
  return write(0, -1);
}

/** Is there a second way from a to b? Then their bond is part of a ring. */
function inSameRing(molecule: Molecule, a: number, b: number): boolean {
  const seen = new Set([a]);
  const queue = [a];
  while (queue.length > 0) {
    const here = queue.shift() as number;
    for (const { atom } of molecule.neighbours(here)) {
      if (here === a && atom === b) continue;
      if (atom === b) return true;
      if (seen.has(atom)) continue;
      seen.add(atom);
      queue.push(atom);
    }
  }
  return false;
}
