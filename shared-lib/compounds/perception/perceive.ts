/** Finds each aldehyde or ketone C=O of a molecule, its class and its descriptors; says why a C=O is none. */

import { type ArylEffect, arylEffect } from "./aryl.ts";
import { findClosure } from "./closure.ts";
import { atomAt, hasOxo, type MoleculeGraph, smallestRing } from "./graph.ts";
import { acylKind, betaAcyls, isAcyl, isCarbonyl, kindOf, notASite } from "./neighbours.ts";
import { sigmaStarOf } from "./sigma-star.ts";
import { classOf } from "./site-class.ts";
import type { CarbonylSite, Perception } from "./types.ts";

/** A site before its product structures are drawn up (the toolkit adds those). */
export type PerceivedSite = Omit<CarbonylSite, "hydrateSmiles" | "closure" | "parent" | "leading" | "cation"> & {
  readonly oxygen: number;
  readonly closureOxygen?: { readonly atom: number; readonly ringSize: 5 | 6 | 7 };
};

export interface Perceived {
  readonly sites: readonly PerceivedSite[];
  readonly ionisable: Perception["ionisable"];
  readonly outside?: string;
}

function groupsAt(graph: MoleculeGraph, index: number) {
  const bonds = atomAt(graph, index).neighbours.filter((bond) => bond.order === 1);
  const kinds = bonds.map((bond) => kindOf(graph, bond.atom, index));
  const aryls: ArylEffect[] = [];
  let sigmaStar = 0;
  let extrapolated = false;
  bonds.forEach((bond, k) => {
    const kind = kinds[k];
    if (kind === "aryl") aryls.push(arylEffect(graph, bond.atom, index));
    else if (kind !== undefined && !isAcyl(kind)) {
      const star = sigmaStarOf(graph, bond.atom, index);
      sigmaStar += star.sigma;
      extrapolated ||= star.extrapolated;
    }
  });
  return { kinds, aryls, sigmaStar, extrapolated: extrapolated || aryls.some((aryl) => aryl.extrapolated) };
}

function siteAt(graph: MoleculeGraph, index: number): PerceivedSite {
  const atom = atomAt(graph, index);
  const { kinds, aryls, sigmaStar, extrapolated } = groupsAt(graph, index);
  const acylKinds = kinds.filter(isAcyl);
  const closure = findClosure(graph, index);
  const ring = smallestRing(graph, index);
  return {
    atom: index,
    oxygen: atom.neighbours.find((bond) => bond.order === 2)?.atom ?? -1,
    class: classOf(graph, index, kinds, aryls),
    hydrogens: Math.min(atom.hydrogens, 2) as 0 | 1 | 2,
    sigmaStar,
    acyl: acylKinds.length,
    acylKinds,
    betaAcyl: betaAcyls(graph, index).length,
    conjugated: kinds.filter((kind) => ["vinyl", "alkynyl", "nitrile"].includes(kind)).length,
    ...(acylKinds.includes("carboxylate") ? { carboxylate: true } : {}),
    ...(aryls[0] ? { aryl: joined(aryls) } : {}),
    ...(ring ? { ringSize: ring.atoms.length } : {}),
    extrapolated,
    ...(closure ? { closureOxygen: closure } : {}),
  };
}

/** Both rings of a diaryl ketone count; the heteroaromatic one gives the name. */
function joined(aryls: readonly ArylEffect[]): NonNullable<CarbonylSite["aryl"]> {
  return {
    sigmaPlus: aryls.reduce((sum, aryl) => sum + aryl.sigmaPlus, 0),
    ring: aryls.find((aryl) => aryl.ring !== "benzene")?.ring ?? "benzene",
    ortho: aryls.flatMap((aryl) => aryl.ortho),
    count: aryls.length,
  };
}

function ionisableGroups(graph: MoleculeGraph): Perception["ionisable"] {
  const groups: { group: string; atom: number }[] = [];
  graph.atoms.forEach((atom, index) => {
    if (isCarbonyl(graph, index) && ["acid", "carboxylate"].includes(acylKind(graph, index)))
      groups.push({ group: "carboxylic acid", atom: index });
    if (atom.element === "N" && atom.aromatic && atom.hydrogens === 0 && atom.neighbours.length === 2)
      groups.push({ group: "pyridine-type N", atom: index });
    const isAmine =
      atom.element === "N" &&
      !atom.aromatic &&
      atom.charge >= 0 &&
      atom.neighbours.every(
        (bond) => bond.order === 1 && !hasOxo(graph, bond.atom) && !atomAt(graph, bond.atom).aromatic,
      );
    if (isAmine) groups.push({ group: "amine", atom: index });
    if (atom.element === "O" && atom.hydrogens > 0 && atom.neighbours.some((bond) => atomAt(graph, bond.atom).aromatic))
      groups.push({ group: "phenol", atom: index });
  });
  return groups;
}

/** An sp3 carbon with an OH and a ring O: the closed form of a hydroxy-aldehyde, -ketone or sugar. */
function isRingHemiacetal(graph: MoleculeGraph): boolean {
  return graph.atoms.some((atom) => {
    if (atom.element !== "C" || atom.aromatic || atom.neighbours.some((bond) => bond.order !== 1)) return false;
    const oxygens = atom.neighbours.filter((bond) => atomAt(graph, bond.atom).element === "O");
    return oxygens.some((bond) => bond.inRing) && oxygens.some((bond) => atomAt(graph, bond.atom).hydrogens > 0);
  });
}

/** An sp3 carbon with two OH: a hydrate. */
function isGemDiol(graph: MoleculeGraph): boolean {
  return graph.atoms.some((atom) => {
    if (atom.element !== "C" || atom.neighbours.some((bond) => bond.order !== 1)) return false;
    const hydroxyls = atom.neighbours.filter((bond) => {
      const other = atomAt(graph, bond.atom);
      return other.element === "O" && other.hydrogens > 0;
    });
    return hydroxyls.length === 2;
  });
}

function noSiteReason(graph: MoleculeGraph, found: string | undefined): string {
  if (isGemDiol(graph)) return "it is written as the hydrate: write the aldehyde or ketone itself";
  if (found !== undefined) return `the C=O is that of ${found}`;
  return isRingHemiacetal(graph)
    ? "it is written as the ring form: write the open-chain aldehyde or ketone"
    : "it has no C=O";
}

/**
 * All carbonyl sites of a molecule.
 *
 * @returns sites in the order of the SMILES; `outside` names the kind of C=O that was found instead, if there is no site
 */
export function perceive(graph: MoleculeGraph): Perceived {
  const sites: PerceivedSite[] = [];
  let found: string | undefined;
  graph.atoms.forEach((_, index) => {
    if (!isCarbonyl(graph, index)) return;
    const reason = notASite(graph, index);
    if (reason === undefined) sites.push(siteAt(graph, index));
    else found ??= reason;
  });
  const outside = sites.length === 0 ? { outside: noSiteReason(graph, found) } : {};
  return { sites, ionisable: ionisableGroups(graph), ...outside };
}
