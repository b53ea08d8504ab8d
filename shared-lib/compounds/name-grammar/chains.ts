/** Alkanes, cycloalkanes and bicycloalkanes with their double and triple bonds, as parents. */

import { Molecule } from "./molecule.ts";

const STEMS: readonly (readonly [string, number])[] = [
  ["octadec", 18],
  ["hexadec", 16],
  ["tetradec", 14],
  ["tridec", 13],
  ["dodec", 12],
  ["undec", 11],
  ["meth", 1],
  ["eth", 2],
  ["prop", 3],
  ["but", 4],
  ["pent", 5],
  ["hex", 6],
  ["hept", 7],
  ["oct", 8],
  ["non", 9],
  ["dec", 10],
];

export interface Chain {
  readonly molecule: Molecule;
  readonly locants: ReadonlyMap<string, number>;
  /** Of methane: every prefix goes there. */
  readonly free?: number;
  readonly ring: boolean;
  readonly length: number;
  /** Behind the stem and its "an", "en" or "yn". */
  readonly end: number;
  /** Locants that the stem's own position word used up ("3-buten-2-one": the 3). */
  readonly usedLeading: boolean;
}

function carbons(count: number, ring: boolean): { molecule: Molecule; locants: Map<string, number> } {
  const molecule = new Molecule();
  const locants = new Map<string, number>();
  for (let i = 0; i < count; i++) {
    molecule.addAtom("C");
    if (i > 0) molecule.addBond(i - 1, i);
    locants.set(String(i + 1), i);
  }
  if (ring && count > 2) molecule.addBond(count - 1, 0);
  return { molecule, locants };
}

/** "bicyclo[3.1.1]": bridgeheads 1 and 1 + a + 1, the bridges in the order of their lengths. */
function bicycle(text: string, at: number): { sizes: readonly [number, number, number]; end: number } | undefined {
  const found = /^bicyclo\[(\d{1,2})\.(\d{1,2})\.(\d{1,2})\]/.exec(text.slice(at, at + 22));
  return found
    ? { sizes: [Number(found[1]), Number(found[2]), Number(found[3])], end: at + found[0].length }
    : undefined;
}

function bicyclic([a, b, c]: readonly [number, number, number]): { molecule: Molecule; locants: Map<string, number> } {
  const main = carbons(a + b + 2, true);
  const { molecule, locants } = main;
  let last = 0;
  for (let i = 0; i < c; i++) {
    const atom = molecule.addAtom("C");
    molecule.addBond(last, atom);
    locants.set(String(a + b + 3 + i), atom);
    last = atom;
  }
  molecule.addBond(last, a + 1);
  return main;
}

/** Unsaturation at `at`: "an", "en", "-2-en", "a-2,4-dien", "yn". */
function unsaturation(
  text: string,
  at: number,
  leading: readonly string[] | undefined,
  length: number,
  ring: boolean,
): { bonds: { locant: string; order: 2 | 3 }[]; end: number; usedLeading: boolean } | undefined {
  if (/^a(?:di|tri)(?:one|al|ol)/.test(text.slice(at, at + 7))) return { bonds: [], end: at + 1, usedLeading: false };
  if (text.startsWith("an", at)) return { bonds: [], end: at + 2, usedLeading: false };
  const found = /^(?:a?-((?:\d{1,2})(?:,\d{1,2})*)-|a)?(di|tri)?(en|yn)/.exec(text.slice(at, at + 20));
  if (!found) return undefined;
  const count = found[2] === "di" ? 2 : found[2] === "tri" ? 3 : 1;
  const order = found[3] === "yn" ? 3 : 2;
  const own = found[1]?.split(",");
  const usedLeading = own === undefined && leading !== undefined;
  // Without a locant: ethene, a ring, or the one place that an acid or aldehyde of three carbons leaves.
  const end = at + found[0].length;
  const only =
    ring || length === 2
      ? ["1"]
      : length === 3 && /^(?:al|o(?:ic|ate|yl))/.test(text.slice(end, end + 4))
        ? ["2"]
        : undefined;
  const locants = own ?? leading ?? only;
  if (!locants) return undefined;
  if (locants.length !== count) return undefined;
  return { bonds: locants.map((locant) => ({ locant, order })), end: at + found[0].length, usedLeading };
}

/** The chain or ring whose name begins at `at`. `leading`: locants right before it. */
export function chainsAt(text: string, at: number, leading: readonly string[] | undefined): readonly Chain[] {
  const bridged = bicycle(text, at);
  const ring = !bridged && text.startsWith("cyclo", at);
  const start = bridged ? bridged.end : ring ? at + 5 : at;
  return STEMS.flatMap(([stem, count]) => {
    if (!text.startsWith(stem, start)) return [];
    if (bridged && bridged.sizes[0] + bridged.sizes[1] + bridged.sizes[2] + 2 !== count) return [];
    const found = unsaturation(text, start + stem.length, leading, count, ring);
    if (!found) return [];
    const { molecule, locants } = bridged ? bicyclic(bridged.sizes) : carbons(count, ring);
    for (const { locant, order } of found.bonds) {
      const first = locants.get(locant);
      const second = locants.get(String(Number(locant) + 1)) ?? (ring ? 0 : undefined);
      const bond = first === undefined || second === undefined ? undefined : molecule.bondBetween(first, second);
      if (!bond) return [];
      bond.order = order;
    }
    return [
      {
        molecule,
        locants,
        ...(count === 1 ? { free: 0 } : {}),
        ring: ring || bridged !== undefined,
        length: count,
        end: found.end,
        usedLeading: found.usedLeading,
      },
    ];
  });
}
