/** What a name ends on: the functional groups that its parent carries. */

import type { Molecule } from "./molecule.ts";

export interface Suffix {
  readonly word: string;
  readonly count: number;
  /** Where it stands without a locant: the end of a chain, or anywhere on a ring. */
  readonly terminal: boolean;
  /** Hangs the group on an atom; gives the oxygens that an ester takes its alkyl on. */
  readonly add: (molecule: Molecule, atom: number) => readonly number[];
}

function oxo(molecule: Molecule, atom: number): readonly number[] {
  molecule.addBond(atom, molecule.addAtom("O"), 2);
  return [];
}

function acid(molecule: Molecule, atom: number): readonly number[] {
  oxo(molecule, atom);
  const oxygen = molecule.addAtom("O");
  molecule.addBond(atom, oxygen);
  return [oxygen];
}

/** A new carbon on the atom, then `add` on it. */
function onCarbon(
  add: (molecule: Molecule, atom: number) => readonly number[],
): (molecule: Molecule, atom: number) => readonly number[] {
  return (molecule, atom) => {
    const carbon = molecule.addAtom("C");
    molecule.addBond(atom, carbon);
    return add(molecule, carbon);
  };
}

function simple(element: string, order: 1 | 2 | 3 = 1): (molecule: Molecule, atom: number) => readonly number[] {
  return (molecule, atom) => {
    molecule.addBond(atom, molecule.addAtom(element), order);
    return [];
  };
}

function amide(molecule: Molecule, atom: number): readonly number[] {
  oxo(molecule, atom);
  return simple("N")(molecule, atom);
}

/** CH2 and then a carbon with `add` on it: the conjunctive names ("indole-3-acetaldehyde"). */
function onEthyl(
  add: (molecule: Molecule, atom: number) => readonly number[],
): (molecule: Molecule, atom: number) => readonly number[] {
  return onCarbon(onCarbon(add));
}

function methylKetone(molecule: Molecule, atom: number): readonly number[] {
  oxo(molecule, atom);
  return simple("C")(molecule, atom);
}

/** Longest first. "ate" words are esters: they need an alkyl word before the name. */
export const SUFFIXES: readonly Suffix[] = [
  { word: "dicarboxaldehyde", count: 2, terminal: false, add: onCarbon(oxo) },
  { word: "dicarbaldehyde", count: 2, terminal: false, add: onCarbon(oxo) },
  { word: "carboaldehyde", count: 1, terminal: false, add: onCarbon(oxo) },
  { word: "acetaldehyde", count: 1, terminal: false, add: onEthyl(oxo) },
  { word: "acetone", count: 1, terminal: false, add: onEthyl(methylKetone) },
  { word: "acetic acid", count: 1, terminal: false, add: onEthyl(acid) },
  { word: "acetate", count: 1, terminal: false, add: onEthyl(acid) },
  { word: "carboxaldehyde", count: 1, terminal: false, add: onCarbon(oxo) },
  { word: "carbaldehyde", count: 1, terminal: false, add: onCarbon(oxo) },
  { word: "dicarboxylic acid", count: 2, terminal: false, add: onCarbon(acid) },
  { word: "carboxylic acid", count: 1, terminal: false, add: onCarbon(acid) },
  { word: "dicarboxylate", count: 2, terminal: false, add: onCarbon(acid) },
  { word: "carboxylate", count: 1, terminal: false, add: onCarbon(acid) },
  { word: "carbonitrile", count: 1, terminal: false, add: onCarbon(simple("N", 3)) },
  { word: "carboxamide", count: 1, terminal: false, add: onCarbon(amide) },
  { word: "dioic acid", count: 2, terminal: true, add: acid },
  { word: "oic acid", count: 1, terminal: true, add: acid },
  { word: "dioate", count: 2, terminal: true, add: acid },
  { word: "oate", count: 1, terminal: true, add: acid },
  { word: "trione", count: 3, terminal: false, add: oxo },
  { word: "dione", count: 2, terminal: false, add: oxo },
  { word: "one", count: 1, terminal: false, add: oxo },
  { word: "dial", count: 2, terminal: true, add: oxo },
  { word: "al", count: 1, terminal: true, add: oxo },
  { word: "amide", count: 1, terminal: true, add: amide },
  { word: "nitrile", count: 1, terminal: true, add: simple("N", 3) },
  { word: "diol", count: 2, terminal: false, add: simple("O") },
  { word: "ol", count: 1, terminal: false, add: simple("O") },
  { word: "thiol", count: 1, terminal: false, add: simple("S") },
  { word: "amine", count: 1, terminal: false, add: simple("N") },
];
