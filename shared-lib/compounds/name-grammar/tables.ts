/** The tables of the grammar, with their fragments read once. */

import raw from "../../generated/name-grammar.json" with { type: "json" };
import { type Molecule, readFragment } from "./molecule.ts";

export interface Piece {
  readonly name: string;
  readonly molecule: Molecule;
  /** Locant to atom. */
  readonly locants: ReadonlyMap<string, number>;
  /** Atom that takes a prefix without a locant. */
  readonly free?: number;
  /** The bond to the parent: a fragment written "=O" brings a double one. */
  readonly order: 1 | 2;
  /** The name is that of an ester, and its alkyls go on these oxygens. */
  readonly ester?: boolean;
  readonly acidOxygens?: readonly number[];
}

type Row = readonly [name: string, smiles: string, locants: string, free: string];
const RAW = raw as unknown as {
  readonly parents: readonly Row[];
  readonly groups: readonly Row[];
  readonly retained: readonly Row[];
};

function pieceOf([name, smiles, locants, free]: Row): Piece {
  const double = smiles.startsWith("=");
  const molecule = readFragment(double ? smiles.slice(1) : smiles);
  const map = new Map<string, number>();
  locants.split(" ").forEach((locant, atom) => {
    if (locant !== "-" && locant !== "" && !map.has(locant)) map.set(locant, atom);
  });
  const freeAtom = free === "" ? undefined : (map.get(free) ?? Number(free) - 1);
  return { name, molecule, locants: map, order: double ? 2 : 1, ...(freeAtom === undefined ? {} : { free: freeAtom }) };
}

/** Hydroxyl oxygens of the carboxylic acids. */
function acidOxygensOf(molecule: Molecule): readonly number[] {
  return molecule.atoms.flatMap((atom, index) => {
    const [only, ...more] = molecule.neighbours(index);
    if (atom.element !== "O" || !only || more.length > 0 || only.bond.order !== 1) return [];
    const onAcid = molecule
      .neighbours(only.atom)
      .some(({ atom: other, bond }) => bond.order === 2 && molecule.atoms[other]?.element === "O");
    return onAcid ? [index] : [];
  });
}

/** A retained acid and, beside it, the name of its ester: "benzoic acid", "benzoate". */
function withEster(rows: readonly Row[]): readonly Piece[] {
  return rows.flatMap((row) => {
    const piece = pieceOf(row);
    if (!piece.name.endsWith("ic acid")) return [piece];
    return [
      piece,
      {
        ...piece,
        name: piece.name.replace(/ic acid$/, "ate"),
        ester: true,
        acidOxygens: acidOxygensOf(piece.molecule),
      },
    ];
  });
}

/** Names by their first letter, longest first: the longest reading is tried first. */
function index(pieces: readonly Piece[]): ReadonlyMap<string, readonly Piece[]> {
  const byLetter = new Map<string, Piece[]>();
  for (const piece of pieces) {
    const letter = piece.name[0] as string;
    byLetter.set(letter, [...(byLetter.get(letter) ?? []), piece]);
  }
  for (const own of byLetter.values()) own.sort((a, b) => b.name.length - a.name.length);
  return byLetter;
}

export interface GrammarTables {
  readonly parents: ReadonlyMap<string, readonly Piece[]>;
  readonly groups: ReadonlyMap<string, readonly Piece[]>;
  readonly retained: ReadonlyMap<string, readonly Piece[]>;
}

let tables: GrammarTables | undefined;

/** The tables, read on first need. */
export function grammarTables(): GrammarTables {
  // "!" keeps a name out that is ambiguous without a locant (tolyl, naphthoyl).
  const pieces = (rows: readonly Row[]): Piece[] => rows.filter((row) => row[1] !== "!").map(pieceOf);
  tables ??= {
    parents: index(pieces(RAW.parents)),
    groups: index(pieces(RAW.groups)),
    retained: index(withEster(RAW.retained)),
  };
  return tables;
}

/** Pieces whose name stands at `at`, longest first. */
export function piecesAt(pieces: ReadonlyMap<string, readonly Piece[]>, text: string, at: number): readonly Piece[] {
  return (pieces.get(text[at] ?? "") ?? []).filter((piece) => text.startsWith(piece.name, at));
}
