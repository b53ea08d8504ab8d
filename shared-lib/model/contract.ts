/**
 * The shapes that the terminal prints (schema 1). Other programs read them: adding a field is fine,
 * renaming or removing one needs a new schema number.
 * Fractions are mole fractions of the reagent's own carbonyl material (0 to 1); temperatures K, amounts mol,
 * volumes L, masses g, times s. Offsets are UTF-16 code units, half-open.
 */

/** A figure with its central 95 % bounds; low ≤ value ≤ high. */
export interface Interval {
  readonly value: number;
  readonly low: number;
  readonly high: number;
}

export type ConstantMethod = "measured" | "correlated" | "analogue";

export interface Constant {
  readonly log10: Interval;
  readonly method: ConstantMethod;
  readonly source: string;
  readonly conditions?: string;
}

export const FORM_KINDS = [
  "free carbonyl",
  "hydrate",
  "hydrate anion",
  "hemiacetal",
  "cyclic hemiacetal",
  "enol",
  "oligomer",
  "iminium or imine",
  "other",
] as const;
export type FormKind = (typeof FORM_KINDS)[number];

export interface FormShare {
  readonly kind: FormKind;
  readonly label: string;
  readonly smiles?: string;
  readonly fraction: Interval;
}

/** One line of how a figure was reached, in order. */
export interface DerivationLine {
  readonly says: string;
  readonly value?: string;
  readonly source?: string;
}

export interface Estimate {
  readonly schema: 1;
  readonly compound: {
    readonly input: string;
    readonly name?: string;
    readonly smiles: string;
    readonly formula: string;
    readonly molarMass: number;
    readonly cas?: string;
  };
  readonly medium: {
    readonly components: readonly {
      readonly name: string;
      readonly smiles: string;
      readonly moleFraction: number;
      readonly volumeFraction: number;
      readonly activity?: number;
    }[];
    readonly pH?: number;
    readonly text: string;
  };
  readonly temperature: number;
  readonly concentration?: number;
  readonly sites: readonly {
    readonly atom: number;
    readonly class: string;
    readonly hydration: Constant;
    readonly alcohols: readonly { readonly name: string; readonly constant: Constant }[];
  }[];
  readonly forms: readonly FormShare[];
  readonly free: Interval;
  readonly time?: { readonly halfLife: Interval; readonly basis: string };
  readonly derivation: readonly DerivationLine[];
  readonly cautions: readonly string[];
  readonly outside?: string;
}

export type Role = "reagent" | "solvent" | "product" | "other";
export type Severity = "hint" | "note" | "warning";
export type AmountOf = "mass" | "volume" | "amount" | "equivalents" | "concentration" | "assay";
export type MediumKind = "aqueous" | "alcoholic" | "mixed" | "aprotic" | "unknown";

export interface TextEdit {
  readonly start: number;
  readonly end: number;
  readonly text: string;
}

export interface Fix {
  readonly title: string;
  readonly edits: readonly TextEdit[];
}

export interface FileReport {
  readonly path: string;
  readonly mentions: readonly {
    readonly start: number;
    readonly end: number;
    readonly text: string;
    readonly smiles?: string;
    readonly name: string;
    readonly role: Role;
    readonly carbonyl: boolean;
  }[];
  readonly charges: readonly {
    readonly mention: number;
    readonly amounts: readonly {
      readonly start: number;
      readonly end: number;
      readonly value: number;
      readonly unit: string;
      readonly of: AmountOf;
    }[];
    readonly total?: Interval;
    readonly suppliedForm?: string;
    readonly step: number;
  }[];
  readonly media: readonly {
    readonly start: number;
    readonly end: number;
    readonly step: number;
    readonly kind: MediumKind;
    readonly components: readonly { readonly name: string; readonly moleFraction: number }[];
    readonly temperature?: number;
    readonly pH?: number;
  }[];
  readonly flask: readonly {
    readonly step: number;
    readonly offset: number;
    readonly temperature: number;
    readonly pH?: number;
    readonly volume?: number;
    readonly components: readonly { readonly name: string; readonly amount: number; readonly activity?: number }[];
    readonly carbonyls: readonly {
      readonly mention: number;
      readonly forms: readonly { readonly kind: FormKind; readonly fraction: Interval }[];
      readonly free: Interval;
    }[];
  }[];
  readonly findings: readonly {
    readonly code: string;
    readonly severity: Severity;
    readonly start: number;
    readonly end: number;
    readonly message: string;
    readonly fixes: readonly Fix[];
  }[];
}

export interface CheckReport {
  readonly schema: 1;
  readonly tool: { readonly name: "oxomargin"; readonly version: string };
  readonly files: readonly FileReport[];
  readonly summary: Readonly<Record<string, number>>;
}
