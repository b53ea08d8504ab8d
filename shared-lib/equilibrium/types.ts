/** What goes into a speciation and what comes out. */

import type { Compound } from "../compounds/types.ts";
import type { Constant, DerivationLine, FormShare, Interval } from "../model/contract.ts";

/** Contents of one vessel. All amounts in mol, volumes in L, temperature in K. */
export interface Contents {
  readonly temperatureK: number;
  /** Undefined: neutral is assumed and said. */
  readonly pH?: number;
  /** L; undefined: from the densities of the solvents. */
  readonly volumeL?: number;
  /** By key of the solvents table. Several rows of one solvent are added. */
  readonly solvents: readonly { readonly solvent: string; readonly amount: number }[];
  readonly carbonyls: readonly {
    readonly compound: Compound;
    /** mol of the free compound, all its forms together. 0: infinitely dilute. */
    readonly amount: number;
  }[];
  /** Everything else that is dissolved: amines, bisulfite, cyanide, acids, salts, buffers. */
  readonly solutes: readonly { readonly compound: Compound; readonly amount: number }[];
  /** Key of the buffers table, with mol/L. */
  readonly buffer?: { readonly buffer: string; readonly molarity?: number };
}

export interface SiteEstimate {
  readonly atom: number;
  readonly class: string;
  readonly hydration: Constant;
  readonly alcohols: readonly { readonly name: string; readonly constant: Constant }[];
}

/** The forms of one carbonyl compound in the vessel; shares add up to 1. */
export interface CarbonylForms {
  readonly forms: readonly FormShare[];
  readonly free: Interval;
  readonly sites: readonly SiteEstimate[];
  readonly time?: { readonly halfLife: Interval; readonly basis: string };
  readonly derivation: readonly DerivationLine[];
  readonly cautions: readonly string[];
  /** Why no estimate is given; then `forms` is empty. */
  readonly outside?: string;
  /**
   * Shares if the amines, hydroxylamines and hydrazines in the vessel, whose condensation is mostly the purpose of the step, came to
   * equilibrium too; absent without such a partner or without a constant for it. `forms` and `free` are those before they do.
   */
  readonly withPartners?: { readonly forms: readonly FormShare[]; readonly free: Interval };
}

export interface Speciation {
  /** One per carbonyl of the contents, in their order. */
  readonly carbonyls: readonly CarbonylForms[];
  /** Of the solvents, by key; water and alcohols always. */
  readonly activities: Readonly<Record<string, number>>;
  /** L */
  readonly volumeL: number;
  /** False when the balance met the bound on its passes first; the shares are then those of the last pass. */
  readonly settled: boolean;
}

export interface SpeciateOptions {
  /** Answer from the correlations alone, never reading a measured constant of the molecule. */
  readonly correlationOnly?: boolean;
}
