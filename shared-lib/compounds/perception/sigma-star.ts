/**
 * Taft σ* of any group, from a table where it holds the group and else from its parts.
 * Scale: CH3 = 0, H = +0.49 (Taft in Newman (ed.), Steric Effects in Organic Chemistry, 1956).
 */

import taft from "../../generated/taft.json" with { type: "json" };
import { atomAt, hasOxo, type MoleculeGraph, othersOf } from "./graph.ts";
import { groupSignature } from "./signature.ts";

/** A σ* and whether it had to be put together from parts. */
export interface SigmaStar {
  readonly sigma: number;
  readonly extrapolated: boolean;
}

const TABLE: Readonly<Record<string, number>> = taft;

/** σ* of a heteroatom whatever it carries, by element, for groups that the table lacks. */
const BARE: Readonly<Record<string, number>> = {
  O: 1.77,
  N: 0.9,
  S: 1.56,
  F: 3.19,
  Cl: 2.94,
  Br: 2.8,
  I: 2.22,
  P: 1.0,
  Si: -0.7,
  B: 0,
  Se: 1.5,
};

/** A heteroatom on the α carbon passes on this share of its σ* (Taft's 1/2.8). */
const ATTENUATION = 0.36;
/** The same for a withdrawing carbon group: CH2CH2OH 0.21 from CH2OH 0.56, CH2CH2Cl 0.39 from CH2Cl 1.01, CH2Ph 0.22 from Ph 0.61. */
const CARBON_ATTENUATION = 0.37;
/** A carbon that only lengthens or branches the chain donates: C2H5 −0.10, i-C3H7 −0.19, t-C4H9 −0.30; less where it is tied in a ring. */
const PER_CARBON = -0.1;
const PER_RING_CARBON = -0.07;
/** Donation of alkyls further out dies away faster: n-C3H7 −0.12, n-C5H11 −0.14. */
const ALKYL_ATTENUATION = 0.15;
/** Three strong groups on one carbon fall short of additivity: CCl3 2.65 and CF3 2.61 against a sum of 3.2 and 3.4. */
const SATURATION = [1, 1, 0.95, 0.8] as const;

const DEEPEST = 8;

function carbonGroup(graph: MoleculeGraph, index: number, from: number, depth: number): number {
  const children = othersOf(graph, index, from);
  const triple = children.find((bond) => bond.order === 3);
  if (triple) return atomAt(graph, triple.atom).element === "N" ? 3.64 : 2.0;
  if (atomAt(graph, index).aromatic) return aromaticGroup(graph, index);
  if (hasOxo(graph, index)) return acylGroup(graph, index, from);
  const double = children.find((bond) => bond.order === 2);
  if (double) return atomAt(graph, double.atom).element === "C" ? 0.5 : 1.2;
  let sum = 0;
  let strong = 0;
  for (const bond of children) {
    const element = atomAt(graph, bond.atom).element;
    const sigma = depth >= DEEPEST ? 0 : groupSigma(graph, bond.atom, index, depth + 1).sigma;
    if (element !== "C") sum += ATTENUATION * sigma;
    else if (sigma > 0) sum += CARBON_ATTENUATION * sigma;
    else sum += (bond.inRing ? PER_RING_CARBON : PER_CARBON) + ALKYL_ATTENUATION * Math.max(sigma, -0.3);
    if (sigma > 2) strong++;
  }
  return sum * (SATURATION[Math.min(strong, 3)] ?? 1);
}

/** Phenyl 0.61 with the field of its ring members: a heteroatom in the ring adds what 2-furyl (1.08) shows. */
function aromaticGroup(graph: MoleculeGraph, index: number): number {
  const near = atomAt(graph, index).neighbours.filter(
    (bond) => bond.inRing && atomAt(graph, bond.atom).element !== "C",
  ).length;
  return 0.61 + 0.47 * near;
}

/**
 * Acyl groups as they act over a CH2, back-calculated with the attenuation from the table's CH2COOH 1.05, CH2COOCH3 1.06, CH2CONH2 0.31,
 * CH2CHO 0.62 and CH2COCH3 0.60; carboxylate −1.06 (recalled).
 */
function acylGroup(graph: MoleculeGraph, index: number, from: number): number {
  for (const bond of othersOf(graph, index, from)) {
    const atom = atomAt(graph, bond.atom);
    if (bond.order === 2) continue;
    if (atom.element === "O") return atom.charge < 0 ? -1.06 : 2.84;
    if (atom.element === "N") return 0.84;
    if (BARE[atom.element] !== undefined) return 2.8;
  }
  return 1.65;
}

function groupSigma(graph: MoleculeGraph, index: number, from: number, depth: number): SigmaStar {
  // An acyl group is never read from the table here: what counts is how it acts over the chain.
  const acyl = depth > 0 && atomAt(graph, index).element === "C" && hasOxo(graph, index);
  const signature = acyl ? undefined : groupSignature(graph, index, from);
  const tabled = signature === undefined ? undefined : TABLE[signature];
  if (tabled !== undefined) return { sigma: tabled, extrapolated: false };
  return { sigma: composed(graph, index, from, depth), extrapolated: true };
}

/** From the parts of the group, each of which may be in the table. */
function composed(graph: MoleculeGraph, index: number, from: number, depth: number): number {
  const atom = atomAt(graph, index);
  if (atom.element === "C") return carbonGroup(graph, index, from, depth);
  const others = othersOf(graph, index, from);
  const oxidised = others.filter((bond) => bond.order === 2).length;
  const acylated = others.some((bond) => bond.order === 1 && hasOxo(graph, bond.atom));
  return (
    (BARE[atom.element] ?? 0) +
    (atom.element === "S" || atom.element === "P" ? oxidised : 0) +
    (acylated ? 0.7 : 0) +
    (atom.charge > 0 ? 3.5 : 0)
  );
}

/**
 * σ* of the group that hangs on atom `from` by its atom `index`.
 * Table value where it holds the group; else Σ over the parts with Taft's attenuation.
 */
export function sigmaStarOf(graph: MoleculeGraph, index: number, from: number): SigmaStar {
  return groupSigma(graph, index, from, 0);
}

/** σ* put together from the group's parts even where the table holds the group: what the estimate of an unknown group is worth. */
export function sigmaStarFromParts(graph: MoleculeGraph, index: number, from: number): number {
  return composed(graph, index, from, 0);
}
