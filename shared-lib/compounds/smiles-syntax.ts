/**
 * Strict reading of SMILES as OpenSMILES defines it: one pass that names the first fault and its place.
 * The structure toolkit is lax (it accepts an open branch or an unclosed aromatic ring), so this runs before it.
 */

export interface SmilesFault {
  readonly problem: string;
  /** Offset in the SMILES. */
  readonly at: number;
}

/** What the scan learns in passing; atoms in the order in which they are written. */
export interface SmilesScan {
  readonly atoms: readonly { readonly aromatic: boolean; readonly bracket: boolean; readonly at: number }[];
}

export const LONGEST_SMILES = 2000;

const ORGANIC_TWO = new Set(["Cl", "Br"]);
const ORGANIC_ONE = new Set([..."BCNOPSFI"]);
const AROMATIC = new Set([..."bcnops"]);
const AROMATIC_BRACKET = new Set(["b", "c", "n", "o", "p", "s", "se", "as", "te"]);
const ELEMENTS = new Set(
  (
    "H He Li Be B C N O F Ne Na Mg Al Si P S Cl Ar K Ca Sc Ti V Cr Mn Fe Co Ni Cu Zn Ga Ge As Se Br Kr Rb Sr Y Zr Nb Mo " +
    "Tc Ru Rh Pd Ag Cd In Sn Sb Te I Xe Cs Ba La Ce Pr Nd Pm Sm Eu Gd Tb Dy Ho Er Tm Yb Lu Hf Ta W Re Os Ir Pt Au Hg Tl Pb " +
    "Bi Po At Rn Fr Ra Ac Th Pa U Np Pu Am Cm Bk Cf Es Fm Md No Lr"
  ).split(" "),
);
const BONDS = new Set([..."-=#$:/\\"]);

const NUMBER_OF = new Map([...ELEMENTS].map((element, i) => [element, i + 1]));

/** A mass number that the element can have: never fewer nucleons than protons, never far more than three times as many. */
function isIsotope(mass: number, element: string): boolean {
  const protons = NUMBER_OF.get(`${element[0]?.toUpperCase()}${element.slice(1)}`) ?? 0;
  return mass >= protons && mass <= 2.6 * protons + 4;
}

const isDigit = (c: string | undefined): boolean => c !== undefined && c >= "0" && c <= "9";

/** Length of a bracket atom's content up to `]`, or the fault in it. Grammar: isotope? symbol chiral? hcount? charge? class? */
function scanBracket(smiles: string, open: number): { end: number; aromatic: boolean } | SmilesFault {
  const close = smiles.indexOf("]", open);
  if (close < 0) return { problem: "the bracket atom is not closed: add ]", at: open };
  let i = open + 1;
  while (isDigit(smiles[i])) i++;
  const isotopeEnd = i;
  const two = smiles.slice(i, i + 2);
  const one = smiles.slice(i, i + 1);
  let aromatic = false;
  if (ELEMENTS.has(two) || AROMATIC_BRACKET.has(two)) {
    aromatic = AROMATIC_BRACKET.has(two);
    i += 2;
  } else if (ELEMENTS.has(one) || AROMATIC_BRACKET.has(one)) {
    aromatic = AROMATIC_BRACKET.has(one);
    i += 1;
  } else return { problem: `"${smiles.slice(open, close + 1)}" names no element`, at: open };
  const element = smiles.slice(isotopeEnd, i);
  if (isotopeEnd > open + 1 && !isIsotope(Number(smiles.slice(open + 1, isotopeEnd)), element))
    return {
      problem: `no isotope of ${element} has the mass number ${smiles.slice(open + 1, isotopeEnd)}`,
      at: open + 1,
    };
  if (smiles[i] === "@") i += smiles[i + 1] === "@" ? 2 : 1;
  if (smiles[i] === "H") {
    i++;
    while (isDigit(smiles[i])) i++;
  }
  if (smiles[i] === "+" || smiles[i] === "-") {
    const sign = smiles[i];
    while (smiles[i] === sign) i++;
    while (isDigit(smiles[i])) i++;
  }
  if (smiles[i] === ":") {
    i++;
    while (isDigit(smiles[i])) i++;
  }
  if (i !== close) return { problem: `"${smiles.slice(open, close + 1)}" is not a bracket atom`, at: i };
  return { end: close + 1, aromatic };
}

/**
 * Scans a SMILES once, left to right.
 *
 * @returns the atoms in writing order, or the first fault with its offset
 */
export function scanSmiles(smiles: string): SmilesScan | SmilesFault {
  if (smiles.length === 0) return { problem: "the SMILES is empty", at: 0 };
  if (smiles.length > LONGEST_SMILES)
    return { problem: `longer than ${LONGEST_SMILES} characters`, at: LONGEST_SMILES };
  const atoms: { aromatic: boolean; bracket: boolean; at: number }[] = [];
  const branches: number[] = [];
  const rings = new Map<string, number>();
  let before: "start" | "atom" | "bond" | "open" = "start";
  let i = 0;
  const fault = (problem: string, at = i): SmilesFault => ({ problem, at });
  while (i < smiles.length) {
    const c = smiles[i] as string;
    if (c === "[") {
      const bracket = scanBracket(smiles, i);
      if ("problem" in bracket) return bracket;
      atoms.push({ aromatic: bracket.aromatic, bracket: true, at: i });
      i = bracket.end;
      before = "atom";
    } else if (ORGANIC_TWO.has(smiles.slice(i, i + 2))) {
      atoms.push({ aromatic: false, bracket: false, at: i });
      i += 2;
      before = "atom";
    } else if (ORGANIC_ONE.has(c) || AROMATIC.has(c)) {
      atoms.push({ aromatic: AROMATIC.has(c), bracket: false, at: i });
      i++;
      before = "atom";
    } else if (BONDS.has(c)) {
      if (before === "start" || before === "bond") return fault("a bond has no atom before it");
      before = "bond";
      i++;
    } else if (c === "(") {
      if (before !== "atom") return fault("a branch has no atom to stand on");
      branches.push(i);
      before = "open";
      i++;
    } else if (c === ")") {
      if (branches.length === 0) return fault("a branch is closed that was never opened");
      if (before !== "atom") return fault("an empty branch, or a bond that leads nowhere");
      branches.pop();
      i++;
    } else if (isDigit(c) || c === "%") {
      if (before !== "atom" && !(before === "bond" && atoms.length > 0))
        return fault("a ring closure has no atom before it");
      const label = c === "%" ? smiles.slice(i + 1, i + 3) : c;
      if (c === "%" && !(isDigit(label[0]) && isDigit(label[1]))) return fault("% needs two digits");
      const key = String(Number(label));
      if (rings.has(key)) rings.delete(key);
      else rings.set(key, i);
      i += c === "%" ? 3 : 1;
      before = "atom";
    } else if (c === ".") {
      if (before !== "atom" || branches.length > 0) return fault("a dot stands where an atom must");
      before = "start";
      i++;
    } else return fault(`"${c}" is not part of a SMILES`);
  }
  const open = branches[0];
  if (open !== undefined) return fault("the branch is not closed: add )", open);
  const ring = [...rings.values()][0];
  if (ring !== undefined)
    return fault(`ring ${smiles.slice(ring, ring + (smiles[ring] === "%" ? 3 : 1))} is not closed`, ring);
  if (before !== "atom") return fault("the SMILES ends where an atom must follow", smiles.length);
  return { atoms };
}
