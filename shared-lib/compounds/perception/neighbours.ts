/** What hangs on a carbonyl carbon, and why a C=O is no aldehyde or ketone. */

import { atomAt, hasOxo, type MoleculeGraph, othersOf } from "./graph.ts";

/** An acyl group by what its other side is: `oxo` is that of an aldehyde or ketone. */
export type AcylKind = "acid" | "carboxylate" | "ester" | "amide" | "oxo" | "derivative";
export type NeighbourKind = AcylKind | "aryl" | "vinyl" | "alkynyl" | "nitrile" | "trifluoromethyl" | "alkyl";

const ACYL = new Set<NeighbourKind>(["acid", "carboxylate", "ester", "amide", "oxo", "derivative"]);

export function isAcyl(kind: NeighbourKind): kind is AcylKind {
  return ACYL.has(kind);
}

/** A carbon with a double bond to O. */
export function isCarbonyl(graph: MoleculeGraph, index: number): boolean {
  return atomAt(graph, index).element === "C" && hasOxo(graph, index);
}

/** Kind of the acyl group whose C=O carbon is `index`. */
export function acylKind(graph: MoleculeGraph, index: number): AcylKind {
  for (const bond of atomAt(graph, index).neighbours) {
    const atom = atomAt(graph, bond.atom);
    if (bond.order === 2) continue;
    if (atom.element === "O") return atom.charge < 0 ? "carboxylate" : atom.hydrogens > 0 ? "acid" : "ester";
    if (atom.element === "N") return "amide";
    if (atom.element !== "C") return "derivative";
  }
  return "oxo";
}

/** Kind of the group that hangs on `from` by its atom `index`. */
export function kindOf(graph: MoleculeGraph, index: number, from: number): NeighbourKind {
  const atom = atomAt(graph, index);
  if (isCarbonyl(graph, index)) return acylKind(graph, index);
  if (atom.aromatic) return "aryl";
  const others = othersOf(graph, index, from);
  const triple = others.find((bond) => bond.order === 3);
  if (triple) return atomAt(graph, triple.atom).element === "N" ? "nitrile" : "alkynyl";
  if (others.some((bond) => bond.order === 2)) return "vinyl";
  if (others.filter((bond) => atomAt(graph, bond.atom).element === "F").length === 3) return "trifluoromethyl";
  return "alkyl";
}

/** Why a C=O is no site, or undefined when it may be one. */
export function notASite(graph: MoleculeGraph, index: number): string | undefined {
  const atom = atomAt(graph, index);
  if (atom.neighbours.filter((bond) => bond.order === 2).length > 1) return "a ketene or carbon dioxide";
  if (atom.charge !== 0) return "a charged carbonyl carbon";
  const single = atom.neighbours.filter((bond) => bond.order === 1).map((bond) => atomAt(graph, bond.atom));
  const count = (element: string): number => single.filter((neighbour) => neighbour.element === element).length;
  if (count("O") === 2) return "a carbonate";
  if (count("N") === 2) return "a urea";
  if (count("O") === 1 && count("N") === 1) return "a carbamate";
  const oxygen = single.find((neighbour) => neighbour.element === "O");
  if (oxygen) return oxygen.hydrogens > 0 || oxygen.charge < 0 ? "a carboxylic acid" : esterName(graph, index);
  if (count("N") === 1) return "an amide, lactam or imide";
  if (count("S") > 0) return "a thioester";
  if (single.some((neighbour) => ["F", "Cl", "Br", "I"].includes(neighbour.element))) return "an acyl halide";
  const other = single.find((neighbour) => !["C", "H"].includes(neighbour.element));
  if (other) return `an acyl group on ${other.element}`;
  if (atom.aromatic) return "an oxo group of an aromatic ring (a pyridone, pyrone or tropone)";
  if (isQuinone(graph, index)) return "a quinone";
  return isTropone(graph, index) ? "a tropone" : undefined;
}

/** The seven-membered ring of sp2 carbons only. */
function isTropone(graph: MoleculeGraph, index: number): boolean {
  const isFlat = (member: number): boolean =>
    atomAt(graph, member).element === "C" && atomAt(graph, member).neighbours.some((bond) => bond.order === 2);
  return graph.rings.some((ring) => ring.atoms.length === 7 && ring.atoms.includes(index) && ring.atoms.every(isFlat));
}

function esterName(graph: MoleculeGraph, index: number): string {
  const oxygen = atomAt(graph, index).neighbours.find(
    (bond) => bond.order === 1 && atomAt(graph, bond.atom).element === "O",
  );
  return oxygen?.inRing ? "a lactone or cyclic anhydride" : "an ester or anhydride";
}

/** Two C=O in one six-membered ring whose other members are all sp2 carbons. */
function isQuinone(graph: MoleculeGraph, index: number): boolean {
  return graph.rings.some((ring) => {
    if (ring.atoms.length !== 6 || !ring.atoms.includes(index)) return false;
    let oxo = 0;
    for (const member of ring.atoms) {
      const atom = atomAt(graph, member);
      if (atom.element !== "C") return false;
      if (hasOxo(graph, member)) oxo++;
      else if (!atom.aromatic && !atom.neighbours.some((bond) => bond.order === 2)) return false;
    }
    return oxo >= 2;
  });
}

/** Kinds of the C=O that stand two bonds away over an sp3 carbon ("CH2COOH": acid), one for each. */
export function betaAcyls(graph: MoleculeGraph, index: number): readonly { kind: AcylKind; enolisable: boolean }[] {
  return atomAt(graph, index).neighbours.flatMap((bond) => {
    const middle = atomAt(graph, bond.atom);
    if (bond.order !== 1 || middle.element !== "C" || middle.aromatic || hasOxo(graph, bond.atom)) return [];
    if (middle.neighbours.some((next) => next.order !== 1)) return [];
    return othersOf(graph, bond.atom, index)
      .filter((next) => isCarbonyl(graph, next.atom))
      .map((next) => ({ kind: acylKind(graph, next.atom), enolisable: middle.hydrogens > 0 }));
  });
}
