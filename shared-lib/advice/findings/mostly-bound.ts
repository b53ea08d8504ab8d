/** Common to the findings that say how most of a carbonyl compound is bound. */

import type { FormKind, Interval } from "../../model/contract.ts";
import { ownFree } from "../conversion.ts";
import { percentWithBounds } from "../figures.ts";
import { writtenBeside } from "../fixes/beside.ts";
import type { AdviceContext, CarbonylView, RawFinding } from "../types.ts";
import { consequenceOf, fixesForBound, insteadOfRaising } from "./say-consequence.ts";

/** Sum of the shares of some kinds of form; bounds are added, which is never too narrow. */
export function shareOf(view: CarbonylView, kinds: readonly FormKind[]): Interval {
  let value = 0;
  let low = 0;
  let high = 0;
  for (const form of view.forms.forms) {
    if (!kinds.includes(form.kind)) continue;
    value += form.fraction.value;
    low += form.fraction.low;
    high += form.fraction.high;
  }
  return { value, low: Math.min(low, value), high: Math.min(1, high) };
}

/** The lower bound of the share must be at least this part of the share that the settings ask for. */
export const LEAST_SURE = 0.5;

const FAMILIES: readonly (readonly FormKind[])[] = [
  ["hydrate", "hydrate anion"],
  ["hemiacetal"],
  ["cyclic hemiacetal"],
  ["oligomer"],
];

/** The family of forms made by the medium or the molecule itself that holds most. */
function largestFamily(view: CarbonylView): readonly FormKind[] | undefined {
  let largest: readonly FormKind[] | undefined;
  let most = 0;
  for (const family of FAMILIES) {
    const { value } = shareOf(view, family);
    if (value <= most) continue;
    largest = family;
    most = value;
  }
  return largest;
}

/**
 * Findings for every carbonyl charge of which at least `boundShare` is bound, mostly as these kinds of form, unless nothing
 * would be changed or the forms are already written beside the charge.
 */
export function lookForBound(
  context: AdviceContext,
  kind: FormKind,
  noun: string,
  concerns: (view: CarbonylView) => boolean = () => true,
): readonly RawFinding[] {
  return context.carbonyls.flatMap((view) => {
    const { forms, charge, mention } = view;
    if (forms.outside !== undefined || forms.forms.length === 0 || !concerns(view)) return [];
    if (1 - ownFree(view) < context.settings.boundShare) return [];
    const family = largestFamily(view);
    if (
      !family?.includes(kind) ||
      shareOf(view, family).low < context.settings.boundShare * LEAST_SURE ||
      writtenBeside(context.text, view)
    )
      return [];
    const said = consequenceOf(context, view);
    if (!said) return [];
    const share = percentWithBounds(shareOf(view, family));
    const free = percentWithBounds(forms.free);
    const message = `${charge.compound.name} is ${share} ${noun} in this flask and ${free} free. ${said.says}.${insteadOfRaising(view, said.mayRaise)}`;
    const fixes = fixesForBound(context, view, said.mayRaise);
    return [
      { start: mention.start, end: mention.end, severity: said.severity, mention: charge.mention, message, fixes },
    ];
  });
}
