/** Where in a text a name that the grammar may read begins and ends. Cheap tests first: most words are no names. */

import { isLetter, isWordCharacter, plainText } from "../normal-form.ts";
import { LONGEST_NAME, readName } from "./read-name.ts";

/** How the name of an aldehyde or ketone ends, and how one of its esters, acids, salts and hydrates does. */
const CARBONYL_END = /(?:aldehyde|[dnthpxym]al|one|phenone|furfural|piperonal|vanillin|benzil|benzoin|isatin)s?$/;
const OTHER_END =
  /(?:acid|ate|ester|ketone|hydrochloride|hydrate|hcl|nitrile|amide|amine|ol|phenol|aniline|toluene|[a-z]ene|[a-z]ole|[a-z]ine|[a-z]ane|furan|pyran|coumaran|salt)s?$/;
const INSIDE =
  /formyl|oxo|oyl|acetyl|keto|acetoacet|pyruv|glyoxyl|levulin|carbonyl|ketone|aldehyde|one hydr|anone|butyryl|propionyl/;

const MOST_WORDS = 4;
const MOST_CACHED = 4000;
const cache = new Map<string, string | undefined>();

function readCached(name: string): string | undefined {
  if (cache.has(name)) return cache.get(name);
  const smiles = readName(name);
  if (cache.size >= MOST_CACHED) cache.delete(cache.keys().next().value as string);
  cache.set(name, smiles);
  return smiles;
}

/** Could this be the name of a carbonyl compound? */
function isLikely(plain: string): boolean {
  const lower = plain.toLowerCase();
  return CARBONYL_END.test(lower) || (OTHER_END.test(lower) && INSIDE.test(lower));
}

/** Ends of the chemical words from `at`: at a space outside brackets, without the punctuation of the sentence. Longest first. */
function endsFrom(text: string, at: number): number[] {
  const ends: number[] = [];
  let depth = 0;
  const limit = Math.min(text.length, at + LONGEST_NAME);
  for (let i = at; i <= limit && ends.length < MOST_WORDS; i++) {
    const c = text[i];
    if (c === "(" || c === "[" || c === "{") depth++;
    else if (c === ")" || c === "]" || c === "}") depth--;
    if (depth < 0) {
      ends.push(i);
      break;
    }
    const over = i === text.length || c === "\n" || c === ";" || c === "|";
    if (!over && !(c === " " && depth <= 0) && !(c === " " && depth > 0 && text[i + 1] === "(")) continue;
    if (depth > 0 && !over) break;
    let end = i;
    while (end > at && /[,.:'"*_]/.test(text[end - 1] as string)) end--;
    if (end > at) ends.push(end);
    // Behind a comma or a full stop the name cannot go on.
    if (over || end < i) break;
  }
  return ends.reverse();
}

/** The longest name from `at` that the grammar reads whole. */
export function grammarNameAt(text: string, at: number): { readonly end: number; readonly smiles: string } | undefined {
  const c = text[at];
  if (!isWordCharacter(c) && c !== "(" && c !== "[") return undefined;
  for (const end of endsFrom(text, at)) {
    if (end - at < 7 || isLetter(text[end])) continue;
    const plain = plainText(text.slice(at, end));
    if (!isLikely(plain)) continue;
    const smiles = readCached(plain) ?? (plain.endsWith("s") ? readCached(plain.slice(0, -1)) : undefined);
    if (smiles !== undefined) return { end, smiles };
  }
  return undefined;
}

/** Structure of a whole name. */
export function grammarName(name: string): string | undefined {
  return readCached(plainText(name.trim()));
}
