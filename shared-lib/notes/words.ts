/** Words that steer the reading: what happens, where the work-up begins, what is a product. All lower case. */

/** A stem that ends the reaction: from here on solvents and reagents belong to no charge. */
export const WORK_UP_STEMS = [
  "extract",
  "wash",
  "filter",
  "filtrat",
  "evaporat",
  "chromatograph",
  "recrystalli",
  "crystalli",
  "distil",
  "purif",
  "partition",
  "triturat",
  "decant",
  "lyophili",
  "precipitat",
  "centrifug",
] as const;

/** Verbs that add something. */
export const ADD_STEMS = [
  "add",
  "charg",
  "treat",
  "dissolv",
  "suspend",
  "combin",
  "mix",
  "introduc",
  "inject",
  "slurr",
  "place",
  "pour",
  "cool",
  "heat",
  "stir",
  "react",
  "reflux",
  "warm",
  "dilut",
  "condens",
] as const;

export const QUENCH_STEMS = ["quench"] as const;

/** Behind one of these stands what was made. */
export const PRODUCT_WORDS = new Set([
  "give",
  "gave",
  "giving",
  "afford",
  "afforded",
  "affording",
  "yield",
  "yielded",
  "yielding",
  "furnish",
  "furnished",
  "provide",
  "provided",
  "providing",
  "obtain",
  "obtained",
  "obtaining",
  "produce",
  "produced",
  "producing",
  "deliver",
  "delivered",
]);

export const TITLE_WORDS = new Set([
  "preparation",
  "synthesis",
  "step",
  "example",
  "intermediate",
  "reference",
  "production",
  "procedure",
  "part",
  "scheme",
]);

/** Solvents behind these are for separation, not for the reaction. */
export const SEPARATION_WORDS = new Set([
  "eluting",
  "eluent",
  "eluted",
  "eluant",
  "hexanes:etoac",
  "gradient",
  "tlc",
  "hplc",
  "column",
  "silica",
  "chromatography",
  "recrystallized",
  "recrystallised",
  "washed",
  "extracted",
  "rinsed",
  "nmr",
  "bath",
]);

export function startsWithAny(word: string, stems: readonly string[]): string | undefined {
  return stems.find((stem) => word.startsWith(stem));
}
