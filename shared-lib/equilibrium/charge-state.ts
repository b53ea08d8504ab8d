/** Which charge state of the compound the constants must be those of, at a pH. */

import type { Compound } from "../compounds/types.ts";
import type { ChargeState } from "./constants/types.ts";

export interface StateShare {
  readonly state: ChargeState;
  readonly share: number;
}

/** Apparent pKa of α-keto acids (pyruvic 2.2–2.5, glyoxylic 3.3, 2-oxobutanoic 2.5) and of pyridinecarbaldehydes (2-: 3.8, 3-: 3.8, 4-: 4.7; recalled). */
const KETO_ACID_PKA = 2.4;
const GLYOXYLIC_PKA = 3.3;
const PYRIDINE_PKA = 4.0;

function acidPKa(compound: Compound): number | undefined {
  const site = compound.carbonyl?.sites.find(
    (candidate) =>
      candidate.class === "alpha-keto acid" || (candidate.class === "alpha-oxo aldehyde" && candidate.acyl > 0),
  );
  const acid = compound.carbonyl?.ionisable.some((group) => group.group === "carboxylic acid");
  if (!site || !acid) return undefined;
  return site.hydrogens > 0 ? GLYOXYLIC_PKA : KETO_ACID_PKA;
}

/** Shares of the states at a pH; one state of share 1 for a compound whose constant does not depend on it. */
export function chargeStates(compound: Compound, pH: number): readonly StateShare[] {
  const acid = acidPKa(compound);
  if (acid !== undefined) {
    const anion = 1 / (1 + 10 ** (acid - pH));
    return [
      { state: "neutral", share: 1 - anion },
      { state: "anion", share: anion },
    ];
  }
  const pyridine = compound.carbonyl?.sites[0]?.aryl?.ring.startsWith("pyridine") ?? false;
  if (pyridine) {
    const cation = 1 / (1 + 10 ** (pH - PYRIDINE_PKA));
    return [
      { state: "neutral", share: 1 - cation },
      { state: "cation", share: cation },
    ];
  }
  return [{ state: "neutral", share: 1 }];
}
