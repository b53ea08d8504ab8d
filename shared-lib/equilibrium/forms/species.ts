/** The language of the mass balance: what a carbonyl compound can become in the vessel, as plain data. */

import type { CarbonylSite } from "../../compounds/perception/types.ts";
import type { Compound } from "../../compounds/types.ts";
import type { DerivationLine, FormKind } from "../../model/contract.ts";
import type { PartnerKind } from "../adducts/adducts.ts";
import type { ConstantEstimate } from "../constants/types.ts";

/** What log10 of a ratio gains per standard deviation of each independent source of error, by the name of the source. */
export type ErrorSources = Readonly<Record<string, number>>;

/** A share of the carbonyl groups of a species, as it is reported. */
export interface FormPart {
  readonly kind: FormKind;
  readonly label: string;
  readonly smiles?: string | undefined;
  /** Of the species' carbonyl groups, in this form; the parts of a species add up to 1. */
  readonly share: number;
}

/** Water counts as one ligand whatever its isotopes; an alcohol by its key; a dissolved partner as `with:` and its id. */
export const WATER = "water";

/**
 * What of the medium changes a ratio beyond mass action, by name; the same name means the same correction and the same error.
 * `diol` and its two exceptions: solvation of a hydrate; `alcohol:` and a key: of a hemiacetal; `condensed`: water is set free.
 */
export type MediumCorrection = "diol" | "diol of a keto acid" | "acidic diol" | "condensed" | `alcohol:${string}`;

export interface Species {
  /** Molecules of the compound in it (2 for a dimer). */
  readonly units: number;
  readonly holds: readonly { readonly ligand: string; readonly count: number }[];
  /**
   * ln of [species]/([free]^units · Π ligand^count): mol/L for the compound and for dissolved partners; water and alcohols relative to
   * the pure liquid. `free` is the uncharged, open, unhydrated molecule.
   */
  readonly ln: number;
  readonly corrections: readonly { readonly name: MediumCorrection; readonly count: number }[];
  readonly errors: ErrorSources;
  readonly parts: readonly FormPart[];
}

/** One set of species that share a free molecule: a whole compound, or one of its sites where they do not feel each other. */
export interface SpeciesSet {
  readonly species: readonly Species[];
}

/** A site with the constants it was answered by, for the report. */
export interface SiteConstants {
  readonly site: CarbonylSite;
  readonly hydration: ConstantEstimate;
  readonly alcohols: readonly { readonly name: string; readonly constant: ConstantEstimate }[];
}

/** Everything that a compound can become under given conditions; independent of amounts. */
export interface CompoundForms {
  readonly sets: readonly SpeciesSet[];
  readonly sites: readonly SiteConstants[];
  readonly lines: readonly DerivationLine[];
  readonly cautions: readonly string[];
}

/** A dissolved partner that adds to carbonyls. */
export interface Partner {
  readonly compound: Compound;
  readonly kind: PartnerKind;
}

/** The conditions that species depend on. */
export interface Conditions {
  readonly temperatureK: number;
  readonly pH: number;
  readonly correlationOnly: boolean;
  readonly water: boolean;
  /** Keys of the alcohols in the vessel. */
  readonly alcohols: readonly string[];
  /** Partners whose adducts are to be counted. */
  readonly partners: readonly Partner[];
  /** More than a few tenths of a mole per litre of carbonyl: longer chains count. */
  readonly concentrated: boolean;
}
