/** The measured hydration constants as points for the regression, one a compound and charge state. */

import { createStructureToolkit } from "../../shared-lib/compounds/structure.ts";
import { inChargeState } from "../../shared-lib/equilibrium/constants/correlate.ts";
import { measuredConstant, measuredParents } from "../../shared-lib/equilibrium/constants/measured.ts";
import { extraVariance, type Family, familyOf, featuresOf } from "../../shared-lib/equilibrium/constants/terms.ts";
import type { ChargeState } from "../../shared-lib/equilibrium/constants/types.ts";

export interface Point {
  readonly smiles: string;
  readonly state: ChargeState;
  readonly siteClass: string;
  readonly family: Family;
  readonly x: readonly number[];
  /** log10 K of one site at 25 °C. */
  readonly y: number;
  /** Variance of the measurement and of the descriptors. */
  readonly variance: number;
  readonly external: boolean;
}

const toolkit = createStructureToolkit();

function pointOf(smiles: string, state: ChargeState): Point | undefined {
  const reading = toolkit.read(smiles);
  if (!reading.ok || !reading.carbonyl) return undefined;
  const like = reading.carbonyl.sites.filter((site) => site.leading);
  const written = like[0];
  // Formaldehyde has no term of its own: it would be fitted on itself.
  if (!written || written.class === "beta-dicarbonyl" || written.class === "formaldehyde") return undefined;
  const found = measuredConstant(smiles, written.class, state);
  if (!found) return undefined;
  const site = inChargeState(written, state);
  return {
    smiles,
    state,
    siteClass: site.class,
    family: familyOf(site),
    x: featuresOf(site),
    // A published constant counts every like site; the correlation speaks of one.
    y: found.log10 - Math.log10(like.length),
    variance: found.sd ** 2 + extraVariance(site),
    external: found.values.some((value) => value.external),
  };
}

/** Every compound and state with a measured value in use. */
export function fitPoints(): readonly Point[] {
  const states: readonly ChargeState[] = ["neutral", "anion", "cation"];
  return states.flatMap((state) => measuredParents(state).flatMap((smiles) => pointOf(smiles, state) ?? []));
}
