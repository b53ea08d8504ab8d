/** A constant of one site, with its error on log10 K. */

import type { ConstantMethod, DerivationLine } from "../../model/contract.ts";

export interface ConstantEstimate {
  /** log10 of K at the temperature asked for. */
  readonly log10: number;
  /** Standard deviation on log10 K. */
  readonly sd: number;
  readonly method: ConstantMethod;
  /** Short citation, "recalled from the literature", or the correlation's name. */
  readonly source: string;
  readonly conditions?: string;
  /** How it was reached, for the derivation. */
  readonly lines: readonly DerivationLine[];
}

export interface NoConstant {
  readonly outside: string;
}

/** Charge state of the molecule whose constant is asked for. */
export type ChargeState = "neutral" | "anion" | "cation";

export interface ConstantQuery {
  readonly temperatureK: number;
  readonly state: ChargeState;
  /** Never read a measured hydration constant of the molecule itself. */
  readonly correlationOnly: boolean;
}
