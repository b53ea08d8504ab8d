/** Compounds as the program knows them: plain data, the same whether they come from the catalogue, a name or a structure. */

import type { Interval } from "../model/contract.ts";
import type { Perception } from "./perception/types.ts";
import type { ReagentTag } from "./tags.ts";

export interface Compound {
  /** Unique: the catalogue's key, else the canonical SMILES. */
  readonly id: string;
  readonly name: string;
  /** The compound itself (of a hydrate or an oligomer: the free carbonyl it stands for). */
  readonly smiles: string;
  readonly formula: string;
  /** g/mol */
  readonly molarMass: number;
  readonly cas?: string;
  /** g/mL of the neat liquid at 20–25 °C. */
  readonly density?: number;
  /** What it does in a flask. */
  readonly tags: readonly ReagentTag[];
  /** Present for an aldehyde or ketone; its `sites` are never empty. */
  readonly carbonyl?: Perception;
  /** Key in the solvents table, when it is one. */
  readonly solvent?: string;
  /** Key in the buffers table, when it is one. */
  readonly buffer?: string;
  /** The form the bottle usually holds, when the bare name is not what is weighed (catalogue key of a supplied form). */
  readonly usualForm?: string;
  readonly origin: "catalogue" | "name" | "structure" | "reagents file";
}

/** A form in which a compound is bought or stocked. */
export interface SuppliedForm {
  readonly id: string;
  /** Catalogue id of the compound it gives. */
  readonly of: string;
  readonly label: string;
  readonly kind: "neat" | "solution" | "hydrate" | "hemiacetal" | "acetal" | "oligomer" | "polymer" | "adduct" | "salt";
  /** g of the pure form that hold 1 mol of the compound; of a solution: the compound's own molar mass. */
  readonly massPerMole: number;
  /** Mass fraction of that material in what is weighed (0 to 1). */
  readonly assay?: Interval;
  /** mol/L, where the form is sold by molarity. */
  readonly molarity?: Interval;
  /** g/mL */
  readonly density?: number;
  /** Solvents that come with it, as mass fractions of what is weighed (keys of the solvents table). */
  readonly carries: readonly { readonly solvent: string; readonly massFraction: number }[];
  /** mol of bound water that comes with 1 mol of the compound (1 for a monohydrate). */
  readonly boundWater: number;
  readonly cas?: string;
  readonly smiles?: string;
  /** How it gives the free compound in the flask. */
  readonly release: "at once" | "slow" | "needs acid or base" | "on heating";
  readonly source: string;
}

/** A name, formula, CAS number or structure read at a place of a text. */
export interface NameMatch {
  readonly start: number;
  readonly end: number;
  readonly compound: Compound;
  readonly form?: SuppliedForm;
  readonly by: "name" | "abbreviation" | "formula" | "cas" | "grammar" | "structure" | "label";
}

export type StructureReading =
  | {
      readonly ok: true;
      readonly canonicalSmiles: string;
      readonly formula: string;
      readonly molarMass: number;
      /** Present if there is an aldehyde or ketone C=O that can add a nucleophile. */
      readonly carbonyl?: Perception;
      /** Why there is no site, where a reader might expect one ("a quinone", "an ester", …). */
      readonly outside?: string;
    }
  | { readonly ok: false; readonly problem: string; readonly at?: number };

/**
 * The structure toolkit, loaded only when a note needs it. A port: the one implementation is `structure.ts`.
 * Nothing else imports the toolkit's library.
 */
export interface StructureToolkit {
  /** Reads a SMILES strictly: an open branch, an unclosed ring or an impossible valence is refused with the place. Never throws. */
  read(smiles: string): StructureReading;
  /** SVG drawing with `currentColor` strokes, or undefined for a SMILES that cannot be read. */
  draw(smiles: string, width: number, height: number): string | undefined;
}
