/** How much conversion an equilibrium step loses because part of the carbonyl compound is bound. */

import type { FormKind } from "../model/contract.ts";
import type { CarbonylView } from "./types.ts";

export interface ConversionLoss {
  /** Conversion of the smaller partner for the middle constant, were nothing bound, and as it is. */
  readonly without: number;
  readonly bound: number;
  /** The greatest loss over the range of constants. */
  readonly most: number;
}

/** Water activity below which a step that releases water is not driven any further by taking water away. */
const DRIEST = 0.02;

/**
 * Share of the smaller of `a` and `b` (mol/L) that an addition with constant K (L/mol) turns over.
 * The smaller root of x = K (a − x)(b − x), written so that nothing cancels.
 */
export function additionConversion(constant: number, a: number, b: number): number {
  const least = Math.min(a, b);
  if (!(least > 0) || !(constant > 0)) return 0;
  const sum = a + b + 1 / constant;
  const root = Math.sqrt(Math.max(0, sum * sum - 4 * a * b));
  return Math.min(1, (2 * a * b) / (sum + root) / least);
}

/** Kinds of form that a partner makes, not the medium. */
const OF_PARTNERS: ReadonlySet<FormKind> = new Set<FormKind>(["iminium or imine", "other"]);

/** Share of what the partners have not taken. */
function ownShare({ forms }: CarbonylView): number {
  const taken = forms.forms.reduce((sum, form) => (OF_PARTNERS.has(form.kind) ? sum + form.fraction.value : sum), 0);
  return Math.max(1e-9, 1 - taken);
}

/** Free share of what the partners have not taken. */
export function ownFree(view: CarbonylView): number {
  return Math.min(1, Math.max(view.forms.free.value / ownShare(view), Number.MIN_VALUE));
}

/** @returns undefined when the kind of step has no constant, or amounts do not follow from the note */
export function conversionLoss(view: CarbonylView): ConversionLoss | undefined {
  const { step, charge, moment, forms } = view;
  const constant = step.decision.kind?.constant;
  const litres = moment.speciation.volumeL;
  if (!constant || !charge.total || !(litres > 0) || moment.volumeStated === false) return undefined;
  const partner = step.charges
    .filter(
      ({ charge: index, compound }) =>
        index !== charge.charge && compound.tags.some((tag) => constant.partners.includes(tag)),
    )
    .reduce((sum, row) => sum + (row.total?.value ?? 0), 0);
  if (!(partner > 0)) return undefined;
  const hydration = forms.sites.map((site) => site.hydration.log10.value);
  if (hydration.length === 0) return undefined;
  const water = Math.max(DRIEST, moment.speciation.activities.water ?? 1);
  const dried = constant.releasesWater ? -Math.log10(water) : 0;
  const shift = constant.slope * Math.max(...hydration) + dried;
  const [a, b] = [charge.total.value / litres, partner / litres];
  const free = ownFree(view);
  const at = (log10: number) => {
    const full = 10 ** (log10 + shift);
    return { without: additionConversion(full, a, b), bound: additionConversion(full * free, a, b) };
  };
  const { low, value, high } = constant.atUnitHydration;
  const middle = at(value);
  const losses = [low, value, high].map(at).map(({ without, bound }) => without - bound);
  return { ...middle, most: Math.max(...losses) };
}
