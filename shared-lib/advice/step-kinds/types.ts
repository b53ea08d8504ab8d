/** What a step does, as far as it decides what a bound share means for the charge. */

import type { ReagentTag } from "../../compounds/tags.ts";
import type { Interval } from "../../model/contract.ts";

/** The cases of what a bound share does to a charge. */
export type Consequence =
  | "free carbonyl is consumed"
  | "the step is an equilibrium"
  | "the hydrate reacts"
  | "water destroys the partner"
  | "the alcohol is the partner"
  | "nothing is consumed";

/** What a kind may look at: what was charged and where. */
export interface StepFacts {
  /** Some charge of the step has this tag. */
  has(tag: ReagentTag): boolean;
  readonly aldehyde: boolean;
  readonly formaldehyde: boolean;
  /** Number of different carbonyl compounds charged. */
  readonly carbonyls: number;
  /** Volume shares of the decisive state. */
  readonly waterShare: number;
  readonly alcoholShare: number;
  readonly buffered: boolean;
  /** Nothing but carbonyl compounds, solvents, buffers and salts. */
  readonly alone: boolean;
}

/**
 * How far an equilibrium step goes in water: log10 K (L/mol, free carbonyl) = atUnitHydration + slope · log10 K_h.
 * Additions to C=O run parallel to hydration (slope about 1), condensations to C=N less so.
 */
interface StepConstant {
  /** For a compound with K_h = 1, over usual partners. */
  readonly atUnitHydration: Interval;
  readonly slope: number;
  /** The partner, by its tags. */
  readonly partners: readonly ReagentTag[];
  /** Water is a product, so that less of it drives the step. */
  readonly releasesWater: boolean;
  readonly source: string;
}

export interface StepKind {
  /** As a directive names it. */
  readonly id: string;
  readonly title: string;
  readonly consequence: Consequence;
  /** What binds, and what is consumed, in a sentence each. */
  readonly binds: string;
  readonly consumed: string;
  readonly source: string;
  readonly constant?: StepConstant;
  /** Words of a title that name it, in small letters. */
  readonly words: readonly string[];
  /** Whether what was charged shows it. */
  sees(facts: StepFacts): boolean;
}
