/** The class of a carbonyl site, as a chemist names it. */

import type { ArylEffect } from "./aryl.ts";
import { atomAt, hasOxo, type MoleculeGraph, othersOf, smallestRing } from "./graph.ts";
import { betaAcyls, isAcyl, type NeighbourKind } from "./neighbours.ts";
import type { SiteClass } from "./types.ts";

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

/** An aldehyde or ketone C=O two bonds away, with an H between: the enol takes part. */
function isBetaDicarbonyl(graph: MoleculeGraph, index: number): boolean {
  return betaAcyls(graph, index).some((acyl) => acyl.kind === "oxo" && acyl.enolisable);
}

function aldehydeClass(
  graph: MoleculeGraph,
  index: number,
  kinds: readonly NeighbourKind[],
  aryls: readonly ArylEffect[],
): SiteClass {
  if (kinds.some(isAcyl)) return "alpha-oxo aldehyde";
  if (isBetaDicarbonyl(graph, index)) return "beta-dicarbonyl";
  if (aryls.length > 0) return aryls[0]?.ring === "benzene" ? "aryl aldehyde" : "heteroaryl aldehyde";
  if (kinds.includes("vinyl")) return "enal";
  if (kinds.includes("alkynyl") || kinds.includes("nitrile")) return "ynal";
  return hasAlphaHetero(graph, index) ? "alpha-hetero aldehyde" : "aliphatic aldehyde";
}

function ketoneClass(
  graph: MoleculeGraph,
  index: number,
  kinds: readonly NeighbourKind[],
  aryls: readonly ArylEffect[],
): SiteClass {
  const acyl = kinds.filter(isAcyl);
  if (acyl.length === 0 && kinds.includes("trifluoromethyl")) return "trifluoromethyl ketone";
  if (acyl.length > 1 && acyl.every((kind) => kind === "oxo")) return "vicinal triketone";
  if (acyl.includes("acid") || acyl.includes("carboxylate")) return "alpha-keto acid";
  if (acyl.includes("ester") || acyl.includes("derivative")) return "alpha-keto ester";
  if (acyl.includes("amide")) return "alpha-keto amide";
  if (acyl.length > 0) return "vicinal diketone";
  if (isBetaDicarbonyl(graph, index)) return "beta-dicarbonyl";
  if (aryls.length > 1) return "diaryl ketone";
  if (aryls.length > 0) return "aryl ketone";
  if (kinds.includes("vinyl") || kinds.includes("alkynyl")) return "enone";
  return smallestRing(graph, index) ? "cyclic ketone" : "ketone";
}

/** Class of the site at carbonyl carbon `index`, from the kinds of its neighbours and the aromatic rings among them. */
export function classOf(
  graph: MoleculeGraph,
  index: number,
  kinds: readonly NeighbourKind[],
  aryls: readonly ArylEffect[],
): SiteClass {
  const { hydrogens } = atomAt(graph, index);
  if (hydrogens === 2) return "formaldehyde";
  if (!kinds.some(isAcyl) && hydroxylCount(graph) >= 3 && hasAlphaHetero(graph, index)) return "sugar";
  return hydrogens === 1 ? aldehydeClass(graph, index, kinds, aryls) : ketoneClass(graph, index, kinds, aryls);
}
