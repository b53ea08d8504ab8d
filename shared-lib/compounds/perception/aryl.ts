/**
 * Σσ⁺ over the substituents of the aromatic ring that carries a carbonyl, by position.
 * σ from Hansch, Leo, Taft, Chem. Rev. 1991, 91, 165; σ⁺ where the table has it, else σ.
 */

import hammett from "../../generated/hammett.json" with { type: "json" };
import { atomAt, hasOxo, type MoleculeGraph } from "./graph.ts";
import { groupSignature } from "./signature.ts";

interface HammettRow {
  readonly group: string;
  readonly m: number;
  readonly p: number;
  readonly mPlus?: number;
  readonly pPlus?: number;
}
const TABLE: Readonly<Record<string, HammettRow>> = hammett;

export interface ArylEffect {
  /**
   * Σσ⁺ of the substituents by position; an ortho group counts as the mean of its meta and para constants: that holds
   * 2-chloro-6-nitrobenzaldehyde (log K_h −0.47) and, with a slope near 1.1, the bisulfite adducts of 2-methoxy- against
   * unsubstituted benzaldehyde (2.6×10³ against 6.2×10³ M⁻¹).
   */
  readonly sigmaPlus: number;
  /** "benzene", or the name of the heteroaromatic ring and the place of the carbonyl on it ("pyridine-2"). */
  readonly ring: string;
  readonly ortho: readonly string[];
  readonly extrapolated: boolean;
}

/** A group that the table lacks takes the row of its nearest kin by the atom that touches the ring. */
function nearestKin(graph: MoleculeGraph, index: number): HammettRow {
  const atom = atomAt(graph, index);
  const kin = (key: string): HammettRow => TABLE[key] ?? { group: "H", m: 0, p: 0 };
  if (atom.element === "C") {
    if (hasOxo(graph, index)) {
      const hetero = atom.neighbours.find(
        (bond) => bond.order === 1 && ["O", "N"].includes(atomAt(graph, bond.atom).element),
      );
      if (!hetero) return kin("COCH3");
      return kin(atomAt(graph, hetero.atom).element === "N" ? "CONH2" : "COOCH3");
    }
    if (atom.aromatic) return kin("C6H5");
    if (atom.neighbours.some((bond) => bond.order === 3)) return kin("C#CH");
    if (atom.neighbours.some((bond) => bond.order === 2)) return kin("CH=CH2");
    const strong = atom.neighbours.some((bond) =>
      ["F", "Cl", "Br", "O", "N"].includes(atomAt(graph, bond.atom).element),
    );
    return kin(strong ? "CH2OCH3" : "CH3");
  }
  if (atom.element === "O") return kin("OCH3");
  if (atom.element === "N") {
    if (atom.charge > 0) return kin("N(CH3)3+");
    return kin(atom.neighbours.some((bond) => hasOxo(graph, bond.atom)) ? "NHAc" : "NMe2");
  }
  if (atom.element === "S") return kin(atom.neighbours.some((bond) => bond.order === 2) ? "SO2CH3" : "SCH3");
  return kin("H");
}

function substituent(
  graph: MoleculeGraph,
  index: number,
  ringAtom: number,
): { row: HammettRow; extrapolated: boolean } {
  const signature = groupSignature(graph, index, ringAtom);
  const row = signature === undefined ? undefined : TABLE[signature];
  return row ? { row, extrapolated: false } : { row: nearestKin(graph, index), extrapolated: true };
}

function letterOf(graph: MoleculeGraph, member: number): string {
  const atom = atomAt(graph, member);
  if (atom.element === "C") return "c";
  if (atom.element !== "N") return atom.element.toLowerCase();
  if (atom.charge > 0) return atom.neighbours.some((bond) => atomAt(graph, bond.atom).element === "O") ? "n" : "[n+]";
  return atom.hydrogens > 0 || atom.neighbours.length === 3 ? "[n]" : "n";
}

function ringName(graph: MoleculeGraph, ring: readonly number[], ipso: number): string {
  const hetero = ring.filter((member) => atomAt(graph, member).element !== "C");
  if (hetero.length === 0) return ring.length === 6 ? "benzene" : `C${ring.length}`;
  const place = ring.indexOf(ipso);
  const letters = [...ring.slice(place), ...ring.slice(0, place)].map((member) => letterOf(graph, member));
  const forward = letters.join("");
  const backward = [letters[0], ...letters.slice(1).reverse()].join("");
  return HETEROARYL[forward] ?? HETEROARYL[backward] ?? "heteroaryl";
}

/** Ring pattern read from the carbon that carries the carbonyl. [n]: a pyrrole-type N, [n+]: a protonated or quaternary one. */
const HETEROARYL: Readonly<Record<string, string>> = {
  cccccn: "pyridine-2",
  ccccnc: "pyridine-3",
  cccncc: "pyridine-4",
  cncccn: "pyrimidine-2",
  cccncn: "pyrimidine-4",
  ccncnc: "pyrimidine-5",
  cnccnc: "pyrazine",
  cnnccc: "pyridazine-3",
  ccnncc: "pyridazine-4",
  cncncn: "triazine",
  "c[n]ccc": "pyrrole-2",
  "ccc[n]c": "pyrrole-3",
  cccco: "furan-2",
  cccoc: "furan-3",
  ccccs: "thiophene-2",
  cccsc: "thiophene-3",
  "c[n]ccn": "imidazole-2",
  "c[n]cnc": "imidazole-4",
  "cnc[n]c": "imidazole-4",
  "cn[n]cc": "pyrazole-3",
  "c[n]ncc": "pyrazole-3",
  "ccn[n]c": "pyrazole-4",
  "cc[n]nc": "pyrazole-4",
  cnccs: "thiazole-2",
  cncsc: "thiazole-4",
  cscnc: "thiazole-5",
  cncco: "oxazole-2",
  cncoc: "oxazole-4",
  cocnc: "oxazole-5",
  cnocc: "isoxazole-3",
  ccnoc: "isoxazole-4",
  concc: "isoxazole-5",
  "ccccc[n+]": "pyridinium-2",
  "cccc[n+]c": "pyridinium-3",
  "ccc[n+]cc": "pyridinium-4",
  "c[n]cc[n+]": "imidazolium-2",
  "c[n]c[n+]c": "imidazolium-4",
  "c[n+]c[n]c": "imidazolium-4",
};

function positionOf(ring: readonly number[], ipso: number, member: number): number {
  const apart = Math.abs(ring.indexOf(member) - ring.indexOf(ipso));
  return Math.min(apart, ring.length - apart);
}

/** Effect of the ring that holds aromatic atom `ipso`, which carries the carbonyl carbon `carbonyl`. */
export function arylEffect(graph: MoleculeGraph, ipso: number, carbonyl: number): ArylEffect {
  const rings = graph.rings.filter((ring) => ring.aromatic && ring.atoms.includes(ipso));
  const ring = (rings.sort((a, b) => a.atoms.length - b.atoms.length)[0]?.atoms ?? []) as readonly number[];
  let sigmaPlus = 0;
  let extrapolated = false;
  const ortho: string[] = [];
  for (const member of ring) {
    if (member === ipso) continue;
    const position = positionOf(ring, ipso, member);
    for (const bond of atomAt(graph, member).neighbours) {
      if (ring.includes(bond.atom) || bond.atom === carbonyl) continue;
      const found = substituent(graph, bond.atom, member);
      extrapolated ||= found.extrapolated;
      const { row } = found;
      const meta = row.mPlus ?? row.m;
      const para = row.pPlus ?? row.p;
      sigmaPlus += position === 1 ? (meta + para) / 2 : position === 2 ? meta : para;
      if (position === 1) ortho.push(row.group);
    }
  }
  return { sigmaPlus, ring: ringName(graph, ring, ipso), ortho, extrapolated };
}
