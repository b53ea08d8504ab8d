/**
 * One word of substitutive nomenclature to a structure: prefixes with locants on a parent that ends in a suffix.
 * Longest reading first, with a bound on the steps; a word that is not read to its last letter is not read at all.
 */

import { type Group, groupOf, hang, onFree, saturate } from "./build.ts";
import { chainsAt } from "./chains.ts";
import { locantsAt, multipliersAt, skipSilent } from "./locants.ts";
import type { Molecule } from "./molecule.ts";
import { SUFFIXES, type Suffix } from "./suffixes.ts";
import { grammarTables, piecesAt } from "./tables.ts";

const MOST_STEPS = 6000;
const DEEPEST_BRACKET = 6;

/** Groups that join two others and end nothing: "4-carbonylbenzaldehyde" is no name. */
const LINKERS = new Set(
  "thio sulfinyl sulphinyl sulfonyl sulphonyl oxy carbonyl carbonylamino carbonyloxy sulfonylamino sulfonamido amido".split(
    " ",
  ),
);

interface Placed {
  readonly locants?: readonly string[];
  readonly count: number;
  readonly group: Group;
}

interface Prefixes {
  readonly placed: readonly Placed[];
  /** Locants that carry added hydrogen. */
  readonly hydro: readonly string[];
}

interface Frame {
  readonly molecule: Molecule;
  readonly locants: ReadonlyMap<string, number>;
  readonly free?: number | undefined;
}

type Finish<T> = (at: number, prefixes: Prefixes, leading: readonly string[] | undefined) => T | undefined;

/** One name on its way to a structure; the alkyls of its ester words wait for their oxygens. */
export class Reader {
  #steps = 0;
  readonly #esters: readonly Group[];

  constructor(esters: readonly Group[]) {
    this.#esters = esters;
  }

  /** Reads prefixes from `at` on until `finish` takes the rest. */
  walk<T>(text: string, at: number, prefixes: Prefixes, depth: number, finish: Finish<T>): T | undefined {
    if (++this.#steps > MOST_STEPS) return undefined;
    const from = skipSilent(text, at);
    const done = finish(from, prefixes, undefined);
    if (done !== undefined) return done;
    const list = locantsAt(text, from);
    const start = list ? skipSilent(text, list.end) : from;
    if (list) {
      const withLeading = finish(start, prefixes, list.locants);
      if (withLeading !== undefined) return withLeading;
    }
    for (const { count, end } of multipliersAt(text, start)) {
      if (count > 1 && list && text.startsWith("hydro", end)) {
        const next = text[end + 5] === "-" ? end + 6 : end + 5;
        const result = this.walk(
          text,
          next,
          { ...prefixes, hydro: [...prefixes.hydro, ...list.locants] },
          depth,
          finish,
        );
        if (result !== undefined) return result;
      }
      if (list && list.locants.length !== count) continue;
      // "3,5-di-tert-butyl"
      const groupStart = count > 1 && text[end] === "-" ? end + 1 : end;
      for (const { group, end: behind } of this.groupsAt(text, groupStart, depth)) {
        if (behind >= text.length) continue;
        // "tris(hydroxymethyl)aminomethane": bis and tris count what the bracket holds, not what follows it too.
        const bracket = count > 1 ? closingBracket(text, groupStart) : undefined;
        if (bracket !== undefined && behind > bracket + 1) continue;
        // "methylthiochroman": the thio is the ring's.
        if (
          text.startsWith("thio", behind - 4) &&
          /^(?:chrom|pyran|phen|morph|xanth)/.test(text.slice(behind, behind + 5))
        )
          continue;
        const next = text[behind] === "-" ? behind + 1 : behind;
        const placed: Placed = { count, group, ...(list ? { locants: list.locants } : {}) };
        const result = this.walk(text, next, { ...prefixes, placed: [...prefixes.placed, placed] }, depth, finish);
        if (result !== undefined) return result;
      }
    }
    return undefined;
  }

  /** Groups whose names begin at `at`: longest first, compound ones ("ethoxycarbonylamino") before their parts. */
  groupsAt(text: string, at: number, depth: number): readonly { readonly group: Group; readonly end: number }[] {
    const found: { group: Group; end: number }[] = [];
    for (const { count, end } of multipliersAt(text, at)) {
      for (const first of this.#plainGroupsAt(text, end, depth)) {
        if (count === 1) found.push(first);
        this.#compounds(text, first, count, 0, found);
      }
    }
    return found.sort((a, b) => b.end - a.end);
  }

  /** "methyl" + "thio", "benzyloxy" + "carbonyl" + "amino": a group on the free atom of the one whose name follows. */
  #compounds(
    text: string,
    first: { group: Group; end: number },
    count: number,
    level: number,
    found: { group: Group; end: number }[],
  ): void {
    if (level > 3 || first.group.order !== 1 || ++this.#steps > MOST_STEPS) return;
    const at = text[first.end] === "-" && text[first.end - 1] === ")" ? first.end + 1 : first.end;
    for (const piece of piecesAt(grammarTables().groups, text, at)) {
      const group = onFree(groupOf(piece), first.group, count);
      if (!group) continue;
      // What was free is taken now; a tertiary amino keeps its atom.
      const next = {
        group: { ...group, ...(piece.name === "amino" ? {} : { free: undefined }) } as Group,
        end: at + piece.name.length,
      };
      found.push(next);
      this.#compounds(text, next, 1, level + 1, found);
    }
  }

  #plainGroupsAt(text: string, at: number, depth: number): { group: Group; end: number }[] {
    const whole = piecesAt(grammarTables().groups, text, at).filter((piece) => !LINKERS.has(piece.name));
    const found = whole.map((piece) => ({
      group: groupOf(piece),
      end: at + piece.name.length,
    }));
    for (const piece of piecesAt(grammarTables().parents, text, skipSilent(text, at))) {
      const behind = skipSilent(text, at) + piece.name.length;
      const yl = /^(?:-(\d{1,2}[a-g]?)-?)?yl/.exec(text.slice(behind, behind + 10));
      const attach = yl ? piece.locants.get(yl[1] ?? "") : undefined;
      if (yl && attach !== undefined) found.push({ group: { ...groupOf(piece), attach }, end: behind + yl[0].length });
    }
    for (const chain of chainsAt(text, at, undefined)) {
      const yl = /^(?:-(\d{1,2})-)?yl(?!id)/.exec(text.slice(chain.end, chain.end + 8));
      const attach = yl ? chain.locants.get(yl[1] ?? "1") : undefined;
      if (yl && attach !== undefined)
        found.push({
          group: { molecule: chain.molecule, order: 1, locants: chain.locants, attach },
          end: chain.end + yl[0].length,
        });
    }
    const close = closingBracket(text, at);
    if (close !== undefined && depth < DEEPEST_BRACKET) {
      const group = this.substituent(text.slice(at + 1, close), depth + 1);
      if (group) found.push({ group, end: close + 1 });
    }
    return found;
  }

  /** A whole substituent name: prefixes on a base group. */
  substituent(text: string, depth: number): Group | undefined {
    return this.walk<Group>(text, 0, { placed: [], hydro: [] }, depth, (at, prefixes, leading) => {
      const from = leading ? at : skipSilent(text, at);
      for (const { group, end } of this.groupsAt(
        leading ? `${leading.join(",")}-${text.slice(from)}` : text,
        leading ? 0 : from,
        depth,
      )) {
        if (end !== (leading ? leading.join(",").length + 1 + text.length - from : text.length)) continue;
        const molecule = group.molecule.copy();
        if (hydrogenate(molecule, group, prefixes.hydro, []) && place(molecule, group, prefixes))
          return { ...group, molecule };
      }
      return leading ? this.#numberedYl(text, at, prefixes, leading) : undefined;
    });
  }

  /** "5-methyl-4-oxazolyl", "2-butynyl": the locant right before the parent is that of its free bond. */
  #numberedYl(text: string, at: number, prefixes: Prefixes, leading: readonly string[]): Group | undefined {
    if (leading.length !== 1) return undefined;
    const frames = [
      ...piecesAt(grammarTables().parents, text, at).map((piece) => ({
        frame: piece as Frame,
        end: at + piece.name.length,
        attach: piece.locants.get(leading[0] as string),
      })),
      ...chainsAt(text, at, leading).map((chain) => ({
        frame: chain as Frame,
        end: chain.end,
        attach: chain.usedLeading ? 0 : undefined,
      })),
    ];
    for (const { frame, end, attach } of frames) {
      if (attach === undefined || text.slice(end) !== "yl") continue;
      const molecule = frame.molecule.copy();
      if (hydrogenate(molecule, frame, prefixes.hydro, []) && place(molecule, { ...frame, molecule }, prefixes))
        return { molecule, order: 1, locants: frame.locants, attach };
    }
    return undefined;
  }

  /** The main name: prefixes on a parent with its suffix. */
  main(text: string): Molecule | undefined {
    return this.walk<Molecule>(text, 0, { placed: [], hydro: [] }, 0, (at, prefixes, leading) => {
      const retained = leading ? undefined : this.#retained(text, at, prefixes);
      return retained ?? this.#systematic(text, at, prefixes, leading);
    });
  }

  #retained(text: string, at: number, prefixes: Prefixes): Molecule | undefined {
    for (const piece of piecesAt(grammarTables().retained, text, at)) {
      if (at + piece.name.length !== text.length) continue;
      const molecule = piece.molecule.copy();
      if (!this.#esterify(molecule, piece.ester ? (piece.acidOxygens ?? []) : [])) continue;
      if (place(molecule, piece, prefixes)) return molecule;
    }
    return undefined;
  }

  /** Alkyls of the ester words go on the acid oxygens, all of them or none. */
  #esterify(molecule: Molecule, oxygens: readonly number[]): boolean {
    if (oxygens.length !== this.#esters.length) return false;
    oxygens.forEach((oxygen, i) => {
      hang(molecule, oxygen, this.#esters[i] as Group);
    });
    return true;
  }

  #systematic(
    text: string,
    at: number,
    prefixes: Prefixes,
    leading: readonly string[] | undefined,
  ): Molecule | undefined {
    for (const piece of piecesAt(grammarTables().parents, text, at)) {
      const molecule = this.#withSuffix(text.slice(at + piece.name.length), piece, prefixes, leading, undefined);
      if (molecule) return molecule;
    }
    for (const chain of chainsAt(text, at, leading)) {
      const rest = chain.usedLeading ? undefined : leading;
      const molecule = this.#withSuffix(
        text.slice(chain.end),
        chain,
        prefixes,
        rest,
        chain.ring ? undefined : chain.length,
      );
      if (molecule) return molecule;
    }
    return undefined;
  }

  #withSuffix(
    rest: string,
    parent: Frame,
    prefixes: Prefixes,
    leading: readonly string[] | undefined,
    chainLength: number | undefined,
  ): Molecule | undefined {
    const tail = rest.startsWith("e-") || rest === "e" || /^e[a-z]/.test(rest) ? rest.slice(1) : rest;
    if (tail === "" && !leading && this.#esters.length === 0) {
      const molecule = parent.molecule.copy();
      return hydrogenate(molecule, parent, prefixes.hydro, []) && place(molecule, { ...parent, molecule }, prefixes)
        ? molecule
        : undefined;
    }
    const locants = tail.startsWith("-") ? locantsAt(tail, 1) : undefined;
    const added = locants ? /\((\d{1,2})h\)-?$/.exec(tail.slice(0, locants.end))?.[1] : undefined;
    const word = locants ? tail.slice(locants.end) : tail;
    const suffix = SUFFIXES.find((candidate) => candidate.word === word);
    if (!suffix) return undefined;
    const places = placesOf(suffix, locants?.locants ?? leading, parent, chainLength);
    if (!places) return undefined;
    const molecule = parent.molecule.copy();
    const saturated = [...prefixes.hydro, ...(added ? [added] : [])];
    const ketone = suffix.word === "one" || suffix.word === "dione" || suffix.word === "trione";
    if (!hydrogenate(molecule, parent, saturated, ketone ? places : [])) return undefined;
    const oxygens = places.flatMap((atom) => suffix.add(molecule, atom));
    if (!this.#esterify(molecule, suffix.word.endsWith("ate") ? oxygens : [])) return undefined;
    // "N-" on an amide or amine is its own nitrogen.
    const nitrogen = /am(?:ide|ine)$/.test(suffix.word)
      ? molecule.atoms.findLastIndex((atom) => atom.element === "N")
      : -1;
    const withNitrogen = nitrogen < 0 ? parent.locants : new Map([...parent.locants, ["n", nitrogen]]);
    return place(molecule, { ...parent, locants: withNitrogen, molecule }, prefixes) ? molecule : undefined;
  }
}

/** Saturates hydro positions, and those that become C=O of an aromatic ring when hydro positions go with them. */
function hydrogenate(molecule: Molecule, parent: Frame, hydro: readonly string[], ketones: readonly number[]): boolean {
  const atoms = hydro.map((locant) => parent.locants.get(locant));
  if (atoms.some((atom) => atom === undefined)) return false;
  const aromaticKetones = ketones.filter((atom) => molecule.atoms[atom]?.aromatic);
  // Without added hydrogen only two neighbours may become C=O: an indole-2,3-dione.
  const [first, second] = aromaticKetones;
  const neighbours =
    aromaticKetones.length === 2 && molecule.bondBetween(first as number, second as number) !== undefined;
  if (aromaticKetones.length > 0 && hydro.length === 0 && !neighbours) return false;
  const all = [...(atoms as number[]), ...aromaticKetones];
  return all.length === 0 || saturate(molecule, [...new Set(all)]);
}

/** Atoms that take the suffix. */
function placesOf(
  suffix: Suffix,
  locants: readonly string[] | undefined,
  parent: Frame,
  chainLength: number | undefined,
): number[] | undefined {
  if (locants) {
    if (locants.length !== suffix.count) return undefined;
    const atoms = locants.map((locant) => parent.locants.get(locant));
    return atoms.every((atom) => atom !== undefined) ? (atoms as number[]) : undefined;
  }
  if (suffix.terminal) {
    if (chainLength === undefined) return undefined;
    return suffix.count === 2 ? [0, chainLength - 1] : [0];
  }
  if (suffix.count !== 1) return undefined;
  if (chainLength === undefined)
    return parent.free !== undefined ? [parent.free] : isPlainRing(parent.molecule) ? [0] : undefined;
  // Methanone, ethanone, propanone and butanone need no locant.
  if (chainLength <= 2) return [0];
  return suffix.word === "one" && chainLength <= 4 ? [1] : undefined;
}

/** A ring of one element whose positions are all alike. */
function isPlainRing(molecule: Molecule): boolean {
  return (
    molecule.atoms.every((atom, index) => atom.element === "C" && molecule.neighbours(index).length === 2) &&
    molecule.bonds.every((bond) => bond.order === 1)
  );
}

/** Hangs the prefixes on their places. @returns false when one has none */
function place(molecule: Molecule, frame: Frame, prefixes: Prefixes): boolean {
  for (const { locants, count, group } of prefixes.placed) {
    const atoms = locants
      ? locants.map(
          (locant) =>
            frame.locants.get(locant) ?? frame.locants.get(`${locant}'`) ?? nitrogenOf(locant, molecule, frame),
        )
      : Array.from({ length: count }, () => frame.free);
    if (atoms.some((atom) => atom === undefined)) return false;
    for (const atom of atoms) hang(molecule, atom as number, group);
  }
  return true;
}

/** "N-" on a parent with one ring or amine nitrogen that has no number of its own in the table. */
function nitrogenOf(locant: string, molecule: Molecule, frame: Frame): number | undefined {
  if (locant !== "n") return undefined;
  const numbered = [...frame.locants.values()];
  const nitrogens = molecule.atoms.flatMap((atom, index) =>
    atom.element === "N" && (numbered.includes(index) || numbered.length === 0) ? [index] : [],
  );
  return nitrogens.length === 1 ? nitrogens[0] : undefined;
}

const OPENING: Readonly<Record<string, string>> = { "(": ")", "[": "]", "{": "}" };

function closingBracket(text: string, at: number): number | undefined {
  if (OPENING[text[at] ?? ""] === undefined) return undefined;
  let depth = 0;
  for (let i = at; i < text.length; i++) {
    const c = text[i] as string;
    if (OPENING[c] !== undefined) depth++;
    else if (c === ")" || c === "]" || c === "}") {
      depth--;
      if (depth === 0) return i;
    }
  }
  return undefined;
}
