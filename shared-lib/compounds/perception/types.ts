/** What the correlations need to know of a molecule; plain data, precomputed for the catalogue. */

export type SiteClass =
  | "formaldehyde"
  | "aliphatic aldehyde"
  | "alpha-hetero aldehyde"
  | "enal"
  | "ynal"
  | "aryl aldehyde"
  | "heteroaryl aldehyde"
  | "alpha-oxo aldehyde"
  | "ketone"
  | "cyclic ketone"
  | "enone"
  | "aryl ketone"
  | "diaryl ketone"
  | "trifluoromethyl ketone"
  | "alpha-keto acid"
  | "alpha-keto ester"
  | "alpha-keto amide"
  | "vicinal diketone"
  | "vicinal triketone"
  | "beta-dicarbonyl"
  | "sugar";

export interface CarbonylSite {
  /** Index of the carbonyl carbon in the order of the SMILES. */
  readonly atom: number;
  readonly class: SiteClass;
  /** Number of H on the carbonyl carbon (0, 1, 2). */
  readonly hydrogens: 0 | 1 | 2;
  /** Σσ* (Taft, CH3 = 0) over the groups on the carbonyl carbon that are neither H, acyl nor aromatic. */
  readonly sigmaStar: number;
  /** Number of acyl groups (C=O directly attached). */
  readonly acyl: number;
  /** An acyl group on it is a carboxylate as written. */
  readonly carboxylate?: boolean;
  /** Of an aryl on the carbonyl: Σσ⁺ of its substituents by position, and which stand ortho. */
  readonly aryl?: {
    readonly sigmaPlus: number;
    readonly ring: string;
    readonly ortho: readonly string[];
  };
  /** Ring that holds the carbonyl carbon, if any. */
  readonly ringSize?: number;
  /** Σσ* rests on a group the table lacks (estimated by attenuation from its parts). */
  readonly extrapolated: boolean;
  /** Ring that an OH of the molecule can close on this carbon (5, 6, 7 members), with the SMILES of that hemiacetal. */
  readonly closure?: { readonly ringSize: 5 | 6 | 7; readonly smiles: string };
  /** SMILES of the gem-diol at this site. */
  readonly hydrateSmiles: string;
}

export interface Perception {
  readonly sites: readonly CarbonylSite[];
  /** Acid–base groups whose state changes the constant (carboxylic acid on an α-keto acid, pyridine N …). */
  readonly ionisable: readonly { readonly group: string; readonly atom: number }[];
}
