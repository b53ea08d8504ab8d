/** Finds names, abbreviations, formulas and CAS numbers of compounds in a text. */

import type { Compound, NameMatch, StructureToolkit, SuppliedForm } from "./types.ts";

export interface Lexicon {
  /**
   * Longest compound word that starts exactly at `at` (the caller gives word starts only).
   * Time is linear in the length of the match, not of the text.
   */
  matchAt(text: string, at: number, structures?: StructureToolkit): NameMatch | "needs structures" | undefined;
  /** The compound that a whole string names: a name, an abbreviation, a formula or a CAS number. */
  find(whole: string, structures?: StructureToolkit): NameMatch | "needs structures" | undefined;
  compound(id: string): Compound | undefined;
  /** The catalogue's compound of a canonical SMILES. */
  bySmiles(canonicalSmiles: string): Compound | undefined;
  /** Forms in which a compound is bought, the usual one first. */
  formsOf(id: string): readonly SuppliedForm[];
}
