/** Locants, multiplying prefixes and the parts of a name that carry no constitution (stereo, indicated hydrogen). */

const ORTHO: Readonly<Record<string, string>> = {
  o: "2",
  m: "3",
  p: "4",
  ortho: "2",
  meta: "3",
  para: "4",
  α: "alpha",
  β: "beta",
  ω: "omega",
  alpha: "alpha",
  beta: "beta",
};

export interface LocantList {
  readonly locants: readonly string[];
  /** Behind the hyphen. */
  readonly end: number;
}

function oneLocant(text: string, at: number): { locant: string; end: number } | undefined {
  const found =
    /^(?:(\d{1,2}[a-g]?'{0,2})(?:\(\d{1,2}h\))?|(n'{0,2})(?=[-,])|(ortho|meta|para|alpha|beta|[omp]|α|β|ω)(?=[-,]))/.exec(
      text.slice(at, at + 16),
    );
  if (!found) return undefined;
  const word = found[3];
  return { locant: word ? (ORTHO[word] as string) : (found[1] ?? found[2] ?? ""), end: at + found[0].length };
}

/** "2,4-", "n,n-", "alpha-", "o-" at `at`. */
export function locantsAt(text: string, at: number): LocantList | undefined {
  const locants: string[] = [];
  let i = at;
  for (;;) {
    const one = oneLocant(text, i);
    if (!one) return undefined;
    locants.push(one.locant);
    i = one.end;
    if (text[i] === ",") i += text[i + 1] === " " ? 2 : 1;
    else if (text[i] === "-") return { locants, end: i + 1 };
    else return undefined;
  }
}

const MULTIPLIERS: readonly (readonly [string, number])[] = [
  ["tetrakis", 4],
  ["tris", 3],
  ["bis", 2],
  ["hexa", 6],
  ["penta", 5],
  ["tetra", 4],
  ["tri", 3],
  ["di", 2],
];

/** Multiplying prefixes that stand at `at`, and none. */
export function multipliersAt(text: string, at: number): readonly { readonly count: number; readonly end: number }[] {
  const found = MULTIPLIERS.filter(([word]) => text.startsWith(word, at)).map(([word, count]) => ({
    count,
    end: at + word.length,
  }));
  return [...found, { count: 1, end: at }];
}

/** Words in a bracket that say nothing of the constitution. */
const SILENT_BRACKETS = new Set("rs sr + - +/- ± +- d l dl r* s* e/z racemic cis trans".split(" "));
const SILENT_WORDS = [
  "trans-",
  "cis-",
  "rac-",
  "dl-",
  "d-",
  "l-",
  "meso-",
  "exo-",
  "endo-",
  "syn-",
  "anti-",
  "e-",
  "z-",
];
const INDICATED_HYDROGEN = /^\d{1,2}h-/;
/** One descriptor: up to three characters of place, then r, s, e or z. */
const DESCRIPTOR = /^[0-9a-g]{0,3}[rsez]\*?$/;
const LONGEST_BRACKET = 40;

/** Length of the silent part that stands at `at`: "(e)-", "(1r,5s)-", "trans-", "(±)-", "1h-"; 0 for none. */
function silentLength(text: string, at: number): number {
  if (text[at] === "(") {
    const close = text.indexOf(")", at);
    if (close < 0 || close - at > LONGEST_BRACKET) return 0;
    const inside = text.slice(at + 1, close);
    const silent = SILENT_BRACKETS.has(inside) || inside.split(",").every((part) => DESCRIPTOR.test(part.trim()));
    return silent ? close + 1 - at + (text[close + 1] === "-" ? 1 : 0) : 0;
  }
  const word = SILENT_WORDS.find((candidate) => text.startsWith(candidate, at));
  return word?.length ?? INDICATED_HYDROGEN.exec(text.slice(at, at + 4))?.[0].length ?? 0;
}

/** Offset behind everything silent that stands at `at`. */
export function skipSilent(text: string, at: number): number {
  let i = at;
  for (let length = silentLength(text, i); length > 0; length = silentLength(text, i)) i += length;
  return i;
}
