/** Whole names, which may have several words: esters, salts, hydrates, "methyl phenyl ketone". */

import { type Group, hang } from "./build.ts";
import { Molecule, writeSmiles } from "./molecule.ts";
import { Reader } from "./parse.ts";

export const LONGEST_NAME = 200;

/** Words of an ester before the acid's: "ethyl", "tert-butyl", "diethyl", "methyl ethyl". */
function alkylWords(words: readonly string[]): readonly Group[] | undefined {
  const groups: Group[] = [];
  for (const word of words) {
    const reader = new Reader([]);
    const direct = reader.substituent(word, 1);
    if (direct) groups.push(direct);
    else {
      const double = word.startsWith("di") ? reader.substituent(word.slice(2), 1) : undefined;
      if (!double) return undefined;
      groups.push(double, double);
    }
  }
  return groups;
}

const TAILS: readonly (readonly [RegExp, string])[] = [
  [/ hydrochloride$/, ".Cl"],
  [/ hcl$/, ".Cl"],
  [/ hydrobromide$/, ".Br"],
  [/ trifluoroacetate$/, ".OC(=O)C(F)(F)F"],
  [/ (?:mono)?hydrate$/, ".O"],
  [/ dihydrate$/, ".O.O"],
];

/**
 * Structure of a name.
 *
 * @param name as written, hyphens and primes in their plain form
 * @returns a SMILES without stereo, or undefined for a name that is not read whole
 */
export function readName(name: string): string | undefined {
  let text = name.toLowerCase().trim();
  if (text.length > LONGEST_NAME || text.length < 5) return undefined;
  let extra = "";
  for (let again = true; again; ) {
    again = false;
    for (const [tail, added] of TAILS) {
      if (!tail.test(text)) continue;
      text = text.replace(tail, "");
      extra += added;
      again = true;
    }
  }
  const salt = saltOf(text);
  if (salt) return salt + extra;
  const molecule =
    readWhole(text) ??
    (text.includes(" ")
      ? readWhole(text.replace(/ (?=(?:carb|acet|vanill|benzald|heptan|hexan|butan|propan|pentan))/g, ""))
      : undefined);
  return molecule ? writeSmiles(molecule) + extra : undefined;
}

const METALS: Readonly<Record<string, string>> = {
  sodium: "[Na+]",
  potassium: "[K+]",
  lithium: "[Li+]",
  cesium: "[Cs+]",
};

/** "sodium pyruvate", "phenylpyruvic acid sodium salt": one carboxylate with its metal. */
function saltOf(text: string): string | undefined {
  const before = /^(sodium|potassium|lithium|cesium) (.+ate)$/.exec(text);
  const behind = /^(.+ic acid),? (sodium|potassium|lithium|cesium) salt$/.exec(text);
  const metal = METALS[before?.[1] ?? behind?.[2] ?? ""];
  if (metal === undefined) return undefined;
  const name = before?.[2] ?? behind?.[1]?.replace(/ic acid$/, "ate") ?? "";
  // The anion's oxygen is written as that of an ester of astatine, which no name holds, and the bond is then cut.
  const mark = new Molecule();
  mark.addAtom("At");
  const ester = new Reader([{ molecule: mark, order: 1, locants: new Map(), attach: 0 }]).main(name);
  if (!ester) return undefined;
  const at = ester.atoms.findIndex((atom) => atom.element === "At");
  const oxygen = ester.neighbours(at)[0]?.atom;
  return oxygen === undefined
    ? undefined
    : `${writeSmiles(ester).replace("O[At]", "[O-]").replace("[At]O", "[O-]")}.${metal}`;
}

function readWhole(text: string): Molecule | undefined {
  const acidEnd = text.indexOf(" acid");
  if (text.endsWith(" ester") && acidEnd > 0) {
    const acid = text.slice(0, acidEnd + " acid".length);
    const alkyls = alkylWords(text.slice(acid.length, -" ester".length).replace(",", "").trim().split(" "));
    return alkyls ? new Reader(alkyls).main(acid.replace(/ic acid$/, "ate")) : undefined;
  }
  const words = text.split(" ");
  if (words.length > 1 && text.endsWith("ate")) {
    for (let split = 1; split <= Math.min(2, words.length - 1); split++) {
      const alkyls = alkylWords(words.slice(0, split));
      const molecule = alkyls ? new Reader(alkyls).main(words.slice(split).join(" ")) : undefined;
      if (molecule) return molecule;
    }
    return undefined;
  }
  return functionClass(words) ?? new Reader([]).main(text);
}

/** "methyl phenyl ketone", "phenyl trifluoromethyl ketone". */
function functionClass(words: readonly string[]): Molecule | undefined {
  if (words.at(-1) !== "ketone" || words.length < 2 || words.length > 3) return undefined;
  const groups = alkylWords(words.slice(0, -1));
  if (groups?.length !== 2) return undefined;
  const molecule = new Molecule();
  const carbon = molecule.addAtom("C");
  molecule.addBond(carbon, molecule.addAtom("O"), 2);
  for (const group of groups) hang(molecule, carbon, group);
  return molecule;
}
