/** Finds each aldehyde or ketone C=O of a molecule, its class and its descriptors; says why a C=O is none. */

import { type ArylEffect, arylEffect } from "./aryl.ts";
import { findClosure } from "./closure.ts";
import { atomAt, hasOxo, type MoleculeGraph, othersOf, smallestRing } from "./graph.ts";
import { sigmaStarOf } from "./sigma-star.ts";
import type { CarbonylSite, Perception, SiteClass } from "./types.ts";

/** A site before its product structures are drawn up (the toolkit adds those). */
export type PerceivedSite = Omit<CarbonylSite, "hydrateSmiles" | "closure"> & {
  readonly oxygen: number;
  readonly closureOxygen?: { readonly atom: number; readonly ringSize: number };
};

export interface Perceived {
  readonly sites: readonly PerceivedSite[];
  readonly ionisable: Perception["ionisable"];
  readonly outside?: string;
}

type NeighbourKind =
  | "acid"
  | "carboxylate"
  | "ester"
  | "amide"
  | "acyl"
  | "acid derivative"
  | "aryl"
  | "vinyl"
  | "alkynyl"
  | "nitrile"
  | "trifluoromethyl"
  | "alkyl";

const ACYL = new Set<NeighbourKind>(["acid", "carboxylate", "ester", "amide", "acyl", "acid derivative"]);

function acylKind(graph: MoleculeGraph, index: number): NeighbourKind {
  for (const bond of atomAt(graph, index).neighbours) {
    const atom = atomAt(graph, bond.atom);
    if (bond.order === 2) continue;
    if (atom.element === "O") return atom.charge < 0 ? "carboxylate" : atom.hydrogens > 0 ? "acid" : "ester";
    if (atom.element === "N") return "amide";
    if (atom.element !== "C") return "acid derivative";
  }
  return "acyl";
}

function kindOf(graph: MoleculeGraph, index: number, from: number): NeighbourKind {
  const atom = atomAt(graph, index);
  if (hasOxo(graph, index)) return acylKind(graph, index);
  if (atom.aromatic) return "aryl";
  const others = othersOf(graph, index, from);
  const triple = others.find((bond) => bond.order === 3);
  if (triple) return atomAt(graph, triple.atom).element === "N" ? "nitrile" : "alkynyl";
  if (others.some((bond) => bond.order === 2)) return "vinyl";
  if (others.filter((bond) => atomAt(graph, bond.atom).element === "F").length === 3) return "trifluoromethyl";
  return "alkyl";
}

/** Why a C=O is no site, or undefined when it may be one. */
function notASite(graph: MoleculeGraph, index: number): string | undefined {
  const atom = atomAt(graph, index);
  if (atom.neighbours.filter((bond) => bond.order === 2).length > 1) return "a ketene or carbon dioxide";
  if (atom.charge !== 0) return "a charged carbonyl carbon";
  for (const bond of atom.neighbours) {
    if (bond.order === 2) continue;
    const neighbour = atomAt(graph, bond.atom);
    if (neighbour.element === "O")
      return neighbour.hydrogens > 0 || neighbour.charge < 0 ? "a carboxylic acid" : "an ester";
    if (neighbour.element === "N") return "an amide, urea or imide";
    if (neighbour.element === "S") return "a thioester";
    if (["F", "Cl", "Br", "I"].includes(neighbour.element)) return "an acyl halide";
    if (!["C", "H"].includes(neighbour.element)) return `an acyl group on ${neighbour.element}`;
  }
  if (atom.aromatic) return "an oxo group of an aromatic ring (a pyridone, pyrone or tropone)";
  if (isQuinone(graph, index)) return "a quinone";
  return undefined;
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

/** A ketone or aldehyde C=O two bonds away, with an H between: the enol takes part. */
function isBetaDicarbonyl(graph: MoleculeGraph, index: number): boolean {
  return atomAt(graph, index).neighbours.some((bond) => {
    const middle = atomAt(graph, bond.atom);
    if (middle.element !== "C" || middle.hydrogens === 0 || hasOxo(graph, bond.atom) || middle.aromatic) return false;
    return othersOf(graph, bond.atom, index).some(
      (next) => hasOxo(graph, next.atom) && acylKind(graph, next.atom) === "acyl",
    );
  });
}

function hydroxylCount(graph: MoleculeGraph): number {
  return graph.atoms.filter(
    (atom) => atom.element === "O" && atom.hydrogens > 0 && atom.neighbours.every((bond) => !hasOxo(graph, bond.atom)),
  ).length;
}

function hasAlphaHetero(graph: MoleculeGraph, index: number): boolean {
  return atomAt(graph, index).neighbours.some((bond) => {
    const alpha = atomAt(graph, bond.atom);
    return (
      alpha.element === "C" &&
      !alpha.aromatic &&
      othersOf(graph, bond.atom, index).some((next) => !["C", "H"].includes(atomAt(graph, next.atom).element))
    );
  });
}

function classOf(
  graph: MoleculeGraph,
  index: number,
  kinds: readonly NeighbourKind[],
  aryls: readonly ArylEffect[],
): SiteClass {
  const atom = atomAt(graph, index);
  const acyl = kinds.filter((kind) => ACYL.has(kind));
  if (atom.hydrogens === 2) return "formaldehyde";
  if (acyl.length === 0 && hydroxylCount(graph) >= 3 && hasAlphaHetero(graph, index)) return "sugar";
  if (atom.hydrogens === 1) {
    if (acyl.length > 0) return "alpha-oxo aldehyde";
    if (isBetaDicarbonyl(graph, index)) return "beta-dicarbonyl";
    if (aryls.length > 0) return aryls[0]?.ring === "benzene" ? "aryl aldehyde" : "heteroaryl aldehyde";
    if (kinds.includes("vinyl")) return "enal";
    if (kinds.includes("alkynyl") || kinds.includes("nitrile")) return "ynal";
    return hasAlphaHetero(graph, index) ? "alpha-hetero aldehyde" : "aliphatic aldehyde";
  }
  if (kinds.includes("trifluoromethyl")) return "trifluoromethyl ketone";
  if (acyl.length > 1 && acyl.every((kind) => kind === "acyl")) return "vicinal triketone";
  if (acyl.includes("acid") || acyl.includes("carboxylate")) return "alpha-keto acid";
  if (acyl.includes("ester") || acyl.includes("acid derivative")) return "alpha-keto ester";
  if (acyl.includes("amide")) return "alpha-keto amide";
  if (acyl.length > 0) return "vicinal diketone";
  if (isBetaDicarbonyl(graph, index)) return "beta-dicarbonyl";
  if (aryls.length > 1) return "diaryl ketone";
  if (aryls.length > 0) return "aryl ketone";
  if (kinds.includes("vinyl") || kinds.includes("alkynyl")) return "enone";
  return smallestRing(graph, index) ? "cyclic ketone" : "ketone";
}

function siteAt(graph: MoleculeGraph, index: number): PerceivedSite {
  const atom = atomAt(graph, index);
  const groups = atom.neighbours.filter((bond) => bond.order === 1);
  const oxygen = atom.neighbours.find((bond) => bond.order === 2)?.atom ?? -1;
  const kinds = groups.map((bond) => kindOf(graph, bond.atom, index));
  const aryls: ArylEffect[] = [];
  let sigmaStar = 0;
  let extrapolated = false;
  groups.forEach((bond, k) => {
    const kind = kinds[k] as NeighbourKind;
    if (kind === "aryl") aryls.push(arylEffect(graph, bond.atom, index));
    else if (!ACYL.has(kind)) {
      const star = sigmaStarOf(graph, bond.atom, index);
      sigmaStar += star.sigma;
      extrapolated ||= star.extrapolated;
    }
  });
  const closure = findClosure(graph, index);
  const ring = smallestRing(graph, index);
  return {
    atom: index,
    oxygen,
    class: classOf(graph, index, kinds, aryls),
    hydrogens: Math.min(atom.hydrogens, 2) as 0 | 1 | 2,
    sigmaStar,
    acyl: kinds.filter((kind) => ACYL.has(kind)).length,
    ...(kinds.includes("carboxylate") ? { carboxylate: true } : {}),
    ...(aryls[0]
      ? {
          aryl: {
            sigmaPlus: aryls.reduce((sum, aryl) => sum + aryl.sigmaPlus, 0),
            ring: aryls[0].ring,
            ortho: aryls.flatMap((aryl) => aryl.ortho),
          },
        }
      : {}),
    ...(ring ? { ringSize: ring.atoms.length } : {}),
    extrapolated: extrapolated || aryls.some((aryl) => aryl.extrapolated),
    ...(closure ? { closureOxygen: closure } : {}),
  };
}

function ionisableGroups(graph: MoleculeGraph): Perception["ionisable"] {
  const groups: { group: string; atom: number }[] = [];
  graph.atoms.forEach((atom, index) => {
    if (hasOxo(graph, index) && ["acid", "carboxylate"].includes(acylKind(graph, index)))
      groups.push({ group: "carboxylic acid", atom: index });
    if (atom.element === "N" && atom.aromatic && atom.hydrogens === 0 && atom.neighbours.length === 2)
      groups.push({ group: "pyridine-type N", atom: index });
    if (
      atom.element === "N" &&
      !atom.aromatic &&
      atom.charge >= 0 &&
      atom.neighbours.every(
        (bond) => bond.order === 1 && !hasOxo(graph, bond.atom) && !atomAt(graph, bond.atom).aromatic,
      )
    )
      groups.push({ group: "amine", atom: index });
    if (atom.element === "O" && atom.hydrogens > 0 && atom.neighbours.some((bond) => atomAt(graph, bond.atom).aromatic))
      groups.push({ group: "phenol", atom: index });
  });
  return groups;
}

/**
 * All carbonyl sites of a molecule.
 *
 * @returns sites in the order of the SMILES; `outside` names the kind of C=O that was found instead, if there is no site
 */
export function perceive(graph: MoleculeGraph): Perceived {
  const sites: PerceivedSite[] = [];
  let outside: string | undefined;
  graph.atoms.forEach((atom, index) => {
    if (atom.element !== "C" || !hasOxo(graph, index)) return;
    const reason = notASite(graph, index);
    if (reason === undefined) sites.push(siteAt(graph, index));
    else outside ??= reason;
  });
  return {
    sites,
    ionisable: ionisableGroups(graph),
    ...(sites.length === 0 ? { outside: outside ? `the C=O is that of ${outside}` : "it has no C=O" } : {}),
  };
}
