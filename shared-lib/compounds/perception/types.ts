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
  /** What the other side of each of those acyl groups is; `oxo` is an aldehyde's or ketone's. */
  readonly acylKinds: readonly ("acid" | "carboxylate" | "ester" | "amide" | "oxo" | "derivative")[];
  /** Number of C=O two bonds away over an sp3 carbon (as in CH2COOH on the carbonyl). */
  readonly betaAcyl: number;
  /** Number of C=C, C≡C or C≡N in conjugation with it. */
  readonly conjugated: number;
  /** An acyl group on it is a carboxylate as written. */
  readonly carboxylate?: boolean;
  /** Of an aryl on the carbonyl: Σσ⁺ of its substituents by position, and which stand ortho. */
  readonly aryl?: {
    readonly sigmaPlus: number;
    readonly ring: string;
    readonly ortho: readonly string[];
    /** Aromatic rings on the carbonyl carbon. */
    readonly count: number;
  };
  /** Ring that holds the carbonyl carbon, if any. */
  readonly ringSize?: number;
  /** Σσ* rests on a group the table lacks (estimated by attenuation from its parts). */
  readonly extrapolated: boolean;
  /** Ring that an OH of the molecule can close on this carbon (5, 6, 7 members), with the SMILES of that hemiacetal. */
  readonly closure?: { readonly ringSize: 5 | 6 | 7; readonly smiles: string };
  /** Canonical SMILES of the compound itself: uncharged, without counterions, stereo and isotope labels. */
  readonly parent: string;
  /** A basic N of the molecule is protonated as written. */
  readonly cation?: boolean;
  /** Takes the water first among unlike sites: a constant published for the compound is that of this site. */
  readonly leading: boolean;
  /** SMILES of the gem-diol at this site. */
  readonly hydrateSmiles: string;
}

export interface Perception {
  readonly sites: readonly CarbonylSite[];
  /** Acid–base groups whose state changes the constant (carboxylic acid on an α-keto acid, pyridine N …). */
  readonly ionisable: readonly { readonly group: string; readonly atom: number }[];
}
