/**
 * The structure toolkit: openchemlib behind the port of `types.ts`. The only file that imports it; load it with a dynamic import.
 * Always parsed without coordinates: those cost a few hundred milliseconds at the first molecule.
 */

import { Molecule } from "openchemlib";
import { fragmentOf, type GraphAtom, type MoleculeGraph } from "./perception/graph.ts";
import { type PerceivedSite, perceive } from "./perception/perceive.ts";
import type { CarbonylSite } from "./perception/types.ts";
import { scanSmiles } from "./smiles-syntax.ts";
import type { StructureReading, StructureToolkit } from "./types.ts";

const MOST_HEAVY_ATOMS = 300;

/** Elements that a reagent with a carbonyl may hold as its salt; other metals make a complex that the model does not know. */
const SALT_METALS = new Set(["Li", "Na", "K", "Cs", "Mg", "Ca", "Ba", "Zn", "Al", "Ag"]);
const NON_METALS = new Set("H B C N O F Si P S Cl Ge As Se Br Te I".split(" "));

/** The molecule as perception sees it. */
export function graphOf(molecule: Molecule): MoleculeGraph {
  const atoms: GraphAtom[] = [];
  for (let i = 0; i < molecule.getAtoms(); i++) {
    const neighbours: { atom: number; order: number; inRing: boolean }[] = [];
    for (let k = 0; k < molecule.getConnAtoms(i); k++) {
      const bond = molecule.getConnBond(i, k);
      neighbours.push({
        atom: molecule.getConnAtom(i, k),
        order: molecule.getConnBondOrder(i, k),
        inRing: molecule.isRingBond(bond),
      });
    }
    atoms.push({
      element: molecule.getAtomLabel(i),
      charge: molecule.getAtomCharge(i),
      hydrogens: molecule.getAllHydrogens(i),
      aromatic: molecule.isAromaticAtom(i),
      neighbours,
    });
  }
  const set = molecule.getRingSet();
  const rings = Array.from({ length: set.getSize() }, (_, ring) => ({
    atoms: set.getRingAtoms(ring),
    aromatic: set.isAromatic(ring),
  }));
  return { atoms, rings };
}

/** A fault that the toolkit lets pass: an impossible valence, an aromatic ring that cannot be closed. */
function chemicalFault(
  molecule: Molecule,
  scanned: readonly { readonly aromatic: boolean; readonly bracket: boolean; readonly at: number }[],
): { problem: string; at?: number } | undefined {
  // The library moves H that are written as atoms to the end: places are then no longer those of the text.
  const inOrder = molecule.getAtoms() === scanned.length;
  for (let i = 0; i < molecule.getAllAtoms(); i++) {
    const written = inOrder ? scanned[i] : undefined;
    const label = molecule.getAtomLabel(i);
    const at = written ? { at: written.at } : {};
    if (NON_METALS.has(label) && molecule.getFreeValence(i) < 0)
      return {
        problem: `${label} has ${molecule.getOccupiedValence(i)} bonds; at most ${molecule.getMaxValence(i)} fit`,
        ...at,
      };
    if (written?.aromatic && molecule.getAtomRadical(i) !== 0)
      return { problem: "the aromatic ring does not close: no alternation of bonds fits it", ...at };
    if (written?.aromatic && !molecule.isRingAtom(i))
      return { problem: `${label} is written as aromatic but stands in no ring: write a capital letter`, ...at };
    if (molecule.getAtomRadical(i) !== 0 && NON_METALS.has(label))
      return { problem: `${label} is a radical as written: the model knows none`, ...at };
  }
  return undefined;
}

function firstMessage(error: unknown): string {
  const text = error instanceof Error ? error.message : String(error);
  // Thrown values print as "Class$S19: SmilesParser: …": what follows the last of these words is for the reader.
  const word = "SmilesParser: ";
  const at = text.indexOf(word);
  return at < 0 ? text : text.slice(at + word.length);
}

function parse(smiles: string): { molecule: Molecule } | { problem: string; at?: number } {
  const scan = scanSmiles(smiles);
  if ("problem" in scan) return scan;
  if (scan.atoms.length > MOST_HEAVY_ATOMS * 2)
    return { problem: `more than ${MOST_HEAVY_ATOMS} heavy atoms: larger than the model is made for` };
  try {
    const molecule = Molecule.fromSmiles(smiles, { noCoordinates: true });
    molecule.ensureHelperArrays(Molecule.cHelperRings);
    if (molecule.getAtoms() > MOST_HEAVY_ATOMS)
      return { problem: `more than ${MOST_HEAVY_ATOMS} heavy atoms: larger than the model is made for` };
    return chemicalFault(molecule, scan.atoms) ?? { molecule };
  } catch (error) {
    return { problem: `the SMILES cannot be read: ${firstMessage(error)}` };
  }
}

function complexMetal(molecule: Molecule): string | undefined {
  for (let i = 0; i < molecule.getAllAtoms(); i++) {
    const label = molecule.getAtomLabel(i);
    if (!NON_METALS.has(label) && !SALT_METALS.has(label)) return label;
  }
  return undefined;
}

type PlacedSite = PerceivedSite & Pick<CarbonylSite, "parent" | "leading" | "cation">;

/** Structures of the gem-diol and of the ring that the site can close. */
function withProducts(molecule: Molecule, { oxygen, closureOxygen, ...site }: PlacedSite): CarbonylSite {
  const opened = (): Molecule => {
    const copy = molecule.getCompactCopy();
    for (let bond = 0; bond < copy.getAllBonds(); bond++) {
      const ends = [copy.getBondAtom(0, bond), copy.getBondAtom(1, bond)];
      if (ends.includes(site.atom) && ends.includes(oxygen)) copy.setBondOrder(bond, 1);
    }
    return copy;
  };
  const diol = opened();
  diol.addBond(site.atom, diol.addAtom(8));
  const hydrateSmiles = diol.toIsomericSmiles();
  if (!closureOxygen) return { ...site, hydrateSmiles };
  const ring = opened();
  ring.addBond(site.atom, closureOxygen.atom);
  return { ...site, hydrateSmiles, closure: { ringSize: closureOxygen.ringSize, smiles: ring.toIsomericSmiles() } };
}

/**
 * One SMILES for one constitution, whatever the order in which it was written: the toolkit's own writer follows the input's order, so
 * it is given the molecule in the order of its canonical code. Stereo is dropped with the coordinates.
 */
function canonicalOf(molecule: Molecule): string {
  return Molecule.fromIDCode(molecule.getIDCode(), false).toIsomericSmiles();
}

/** The same, but with stereo where it was written (then in the toolkit's own order): sugars differ by nothing else. */
function canonicalWithStereo(molecule: Molecule): string {
  const own = molecule.toIsomericSmiles();
  return /[@/\\]/.test(own) ? own : canonicalOf(molecule);
}

interface Parent {
  readonly smiles: string;
  /** A basic N is protonated as written. */
  readonly cation: boolean;
}

/**
 * The compound that published constants are filed under: uncharged, without stereo and isotope labels, without counterions.
 * `undefined` for a SMILES of several different carbonyl compounds.
 */
function parentOf(molecule: Molecule, canonical: string): Parent | undefined {
  // Nothing to take off: the common case, and canonising is the costly step.
  if (!/[.@[/\\]/.test(canonical)) return { smiles: canonical, cation: false };
  const parents = new Set<string>();
  let cation = false;
  for (const fragment of molecule.getFragments()) {
    fragment.ensureHelperArrays(Molecule.cHelperRings);
    if (perceive(graphOf(fragment)).sites.length === 0) continue;
    fragment.stripStereoInformation();
    fragment.stripIsotopInfo();
    for (let i = 0; i < fragment.getAtoms(); i++) {
      if (!carriesProtonCharge(fragment, i)) continue;
      cation ||= fragment.getAtomCharge(i) > 0;
      fragment.setAtomCharge(i, 0);
    }
    parents.add(canonicalOf(fragment));
  }
  const [smiles] = parents;
  return parents.size === 1 && smiles !== undefined ? { smiles, cation } : undefined;
}

/** A charge that a proton more or less takes away: O⁻ and S⁻, but not that of a nitro group or N-oxide; N⁺ with an H. */
function carriesProtonCharge(molecule: Molecule, index: number): boolean {
  const charge = molecule.getAtomCharge(index);
  if (charge > 0) return molecule.getAtomLabel(index) === "N" && molecule.getAllHydrogens(index) > 0;
  if (charge === 0) return false;
  for (let k = 0; k < molecule.getConnAtoms(index); k++)
    if (molecule.getAtomCharge(molecule.getConnAtom(index, k)) > 0) return false;
  return ["O", "S"].includes(molecule.getAtomLabel(index));
}

/** Aldehydes before ketones, then what has more acyl groups, then more withdrawing groups: the site that takes the water first. */
function leadingOf(sites: readonly PerceivedSite[]): PerceivedSite | undefined {
  return [...sites].sort(
    (a, b) => b.hydrogens - a.hydrogens || b.acyl - a.acyl || b.sigmaStar - a.sigmaStar || a.atom - b.atom,
  )[0];
}

function isLike(a: PerceivedSite, b: PerceivedSite | undefined): boolean {
  return b !== undefined && a.hydrogens === b.hydrogens && a.acyl === b.acyl && a.class === b.class;
}

function carbonylOf(
  molecule: Molecule,
  canonical: string,
): Pick<StructureReading & { ok: true }, "carbonyl" | "outside"> {
  const graph = graphOf(molecule);
  const seen = perceive(graph);
  if (seen.outside !== undefined) return { outside: seen.outside };
  const parent = parentOf(molecule, canonical);
  if (parent === undefined) return { outside: "it holds two different carbonyl compounds: write one at a time" };
  // Of a salt with two like ions, one stands for both.
  const fragment = fragmentOf(graph, seen.sites[0]?.atom ?? 0);
  const own = seen.sites.filter((site) => fragment.has(site.atom));
  const leading = leadingOf(own);
  const sites = own.map((site) =>
    withProducts(molecule, {
      ...site,
      parent: parent.smiles,
      ...(parent.cation ? { cation: true } : {}),
      leading: isLike(site, leading),
    }),
  );
  return { carbonyl: { sites, ionisable: seen.ionisable } };
}

function read(smiles: string): StructureReading {
  const parsed = parse(smiles);
  if ("problem" in parsed) return { ok: false, ...parsed };
  try {
    const canonicalSmiles = canonicalWithStereo(parsed.molecule);
    // Read again in canonical order: the sites' atoms are those of the SMILES that is given out.
    const molecule = Molecule.fromSmiles(canonicalSmiles, { noCoordinates: true });
    molecule.ensureHelperArrays(Molecule.cHelperRings);
    const formula = molecule.getMolecularFormula();
    const known = {
      ok: true as const,
      canonicalSmiles,
      formula: formula.formula,
      molarMass: formula.relativeWeight,
    };
    const metal = complexMetal(molecule);
    if (metal) return { ...known, outside: `it holds ${metal}: the model knows no metal complexes` };
    return { ...known, ...carbonylOf(molecule, known.canonicalSmiles) };
  } catch (error) {
    return { ok: false, problem: `the structure cannot be worked out: ${firstMessage(error)}` };
  }
}

/** Drawn in the colour of the text around it, so that it reads in every theme. */
function draw(smiles: string, width: number, height: number): string | undefined {
  const parsed = parse(smiles);
  if ("problem" in parsed) return undefined;
  try {
    const molecule = Molecule.fromSmiles(smiles);
    const svg = molecule.toSVG(width, height, "structure", {
      suppressChiralText: true,
      suppressESR: true,
      suppressCIPParity: true,
      noStereoProblem: true,
    });
    return svg.replace(/rgb\(\d+,\d+,\d+\)/g, "currentColor");
  } catch {
    return undefined;
  }
}

/** The toolkit; pure, its two calls never throw. */
export function createStructureToolkit(): StructureToolkit {
  return { read, draw };
}
