/** Units as chemists write them, with what they measure and their size in base units (g, L, mol, 1, mol/L, fraction, g/mL, K, s). */

import type { QuantityKind } from "./types.ts";

export interface Unit {
  readonly unit: string;
  readonly of: QuantityKind;
  readonly factor: number;
}

const UNITS = new Map<string, Unit>();

function add(of: QuantityKind, unit: string, factor: number, spellings: string): void {
  for (const spelling of spellings.split(" ")) UNITS.set(spelling.replaceAll("_", " "), { unit, of, factor });
}

add("mass", "g", 1, "g g. gm gms gram grams grammes gramme G");
add("mass", "mg", 1e-3, "mg mg. milligram milligrams mgs");
add("mass", "kg", 1e3, "kg kg. kilogram kilograms Kg kgs KG");
add("mass", "µg", 1e-6, "µg μg ug mcg");
add("mass", "t", 1e6, "tonnes tonne");
add("volume", "mL", 1e-3, "mL ml mL. ml. ML Ml cc c.c. cm3 cm³ milliliter milliliters millilitre millilitres mls mLs");
add("volume", "L", 1, "L l liter liters litre litres dm3 dm³ lit Ltr");
add("volume", "µL", 1e-6, "µL μL uL µl μl ul microliters microliter");
add("volume", "m³", 1e3, "m3 m³");
add(
  "amount",
  "mmol",
  1e-3,
  "mmol mmol. mmols mmole mmoles mMol mMole mMoles millimol millimole millimoles mMols m.mol mmo1 mmoI",
);
add("amount", "mol", 1, "mol mol. mols mole moles Mol Mole Moles mo1");
add("amount", "µmol", 1e-6, "µmol μmol umol µmole μmole µmoles micromol micromoles");
add("amount", "nmol", 1e-9, "nmol");
add("amount", "kmol", 1e3, "kmol kmole kmoles");
add(
  "equivalents",
  "equiv",
  1,
  "eq eq. equiv equiv. equivalent equivalents eqs equivs eqv eqv. Eq Eq. Equiv Equiv. eqiv equiv's molar_equivalents molar_equivalent mol_equiv mol_eq mol._equiv. mol._eq. molar_equiv molar_eq",
);
add("equivalents", "mol%", 0.01, "mol% mol_% mole% mole_% mol-% mol.% mol.-%");
add("concentration", "M", 1, "M mol/L mol/l mol·L−1 mol·L-1 mol_L−1 mol_L-1 mol.L-1 mol_dm-3 mol/dm3 molar");
add("concentration", "mM", 1e-3, "mM mmol/L mmol/l mmol·L−1");
add("concentration", "µM", 1e-6, "µM μM uM");
add("concentration", "N", 1, "N normal");
add("concentration", "mol/kg", 1, "mol/kg m");
add(
  "assay",
  "wt%",
  0.01,
  "wt% wt_% wt.% wt._% wt-% wt.-% %wt %_wt %_by_weight percent_by_weight weight_% weight% %_w/w %w/w %_(w/w) %(w/w) %_(wt/wt) w/w% w/w_% weight_percent wt/wt_% mass% mass_% m/m%",
);
add("assay", "w/v%", 0.01, "%_w/v %w/v %_(w/v) %(w/v) w/v% w/v_%");
add("assay", "vol%", 0.01, "vol% vol_% vol.% vol._% %_v/v %v/v %_(v/v) %(v/v) v/v% v/v_% %_by_volume volume_%");
add("assay", "%", 0.01, "% percent per_cent ％");
add("density", "g/mL", 1, "g/mL g/ml g/cm3 g/cm³ g·mL−1 g_mL-1 g_cm-3 kg/L kg/l");
add("density", "g/L", 1e-3, "g/L g/l");
add("time", "s", 1, "s sec sec. secs second seconds");
add("time", "min", 60, "min min. mins mins. minute minutes");
add("time", "h", 3600, "h h. hr hr. hrs hrs. hour hours Hrs hr's");
add("time", "d", 86400, "d day days");
add("time", "week", 604800, "week weeks");
add("ratio", "parts", 1, "parts part");

let longest = 0;
for (const key of UNITS.keys()) longest = Math.max(longest, key.length);
const FIRST = new Set([...UNITS.keys()].map((key) => key[0]));

/**
 * The unit that starts at `at`, longest spelling first, not going on into a longer word.
 *
 * @returns the unit and the offset behind it
 */
export function unitAt(text: string, at: number): { readonly unit: Unit; readonly end: number } | undefined {
  if (!FIRST.has(text[at] ?? "")) return undefined;
  for (let length = Math.min(longest, text.length - at); length > 0; length--) {
    const unit = UNITS.get(text.slice(at, at + length));
    if (!unit) continue;
    const next = text[at + length] ?? "";
    const last = text[at + length - 1] ?? "";
    // A letter or digit right behind a letter makes another word ("g" of "grown", "M" of "Me").
    if (/[A-Za-z0-9µμ]/.test(next) && /[A-Za-z0-9]/.test(last)) continue;
    if (last === "." && /[a-z]/.test(next)) continue;
    return { unit, end: at + length };
  }
  return undefined;
}
