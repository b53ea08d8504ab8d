/** What a bound share means for a charge, in words, and what may be done about it. */

import type { Severity } from "../../model/contract.ts";
import { percent, trimmed } from "../figures.ts";
import { besideEdit } from "../fixes/beside.ts";
import { HOW_MUCH, scaleCharge } from "../fixes/scale-charge.ts";
import type { AdviceContext, CarbonylView, SafeFix } from "../types.ts";

/** More than this many times the charge is no correction any more. */
const MOST_TIMES = 3;
/** Below this free share the rate falls so far that the time of a step has to follow. */
const SLOW_SHARE = 0.1;

export interface SaidConsequence {
  readonly severity: Severity;
  readonly says: string;
  /** A larger charge is one of the answers. */
  readonly mayRaise: boolean;
}

const REFILLED = "equivalents stand, because the free share is made good as it is used up";
const SHIFTED = "the step is an equilibrium: more equivalents or less water keep the conversion";

/**
 * @returns undefined when nothing would be changed, so that nothing needs saying
 */
export function consequenceOf(context: AdviceContext, view: CarbonylView): SaidConsequence | undefined {
  const { kind } = view.step.decision;
  const free = view.forms.free.value;
  const rate = `the rate falls to ${percent(free)} of that without binding`;
  if (context.settings.basis === "free") {
    return { severity: "note", says: "the note counts equivalents in free carbonyl", mayRaise: true };
  }
  if (!kind) {
    return {
      severity: "note",
      says: `if the free carbonyl is used up irreversibly, ${REFILLED} and ${rate}; if ${SHIFTED}`,
      mayRaise: true,
    };
  }
  const prefix = kind.title.charAt(0).toLowerCase() + kind.title.slice(1);
  switch (kind.consequence) {
    case "free carbonyl is consumed":
      return free < SLOW_SHARE
        ? { severity: "hint", says: `${prefix}: ${REFILLED}; ${rate}`, mayRaise: false }
        : undefined;
    case "the step is an equilibrium":
      return { severity: "note", says: `${prefix}: ${SHIFTED}`, mayRaise: true };
    case "nothing is consumed":
      return { severity: "note", says: `${prefix}: the next partner meets only the free share`, mayRaise: true };
    case "water destroys the partner":
      return {
        severity: "note",
        says: `${prefix}: each bound O-H uses up the reagent; dry the carbonyl compound or the solvent first`,
        mayRaise: false,
      };
    default:
      return undefined;
  }
}

/** The corrections that a bound share calls for. */
export function fixesForBound(context: AdviceContext, view: CarbonylView, mayRaise: boolean): readonly SafeFix[] {
  const { text } = context;
  const fixes: SafeFix[] = [];
  const times = 1 / view.forms.free.value;
  if (mayRaise && times <= MOST_TIMES) {
    const edits = scaleCharge(text, view.written, HOW_MUCH, times);
    if (edits) {
      const title = `Charge ${trimmed(times, 3)} times as much, to keep the free amount`;
      fixes.push({ title, edits: [...edits, besideEdit(text, view, times)], safe: false });
    }
  }
  fixes.push({ title: "Write the forms beside the charge", edits: [besideEdit(text, view)], safe: false });
  return fixes;
}

/** Said instead of a larger charge that would be absurd. */
export function insteadOfRaising(view: CarbonylView, mayRaise: boolean): string {
  const times = 1 / view.forms.free.value;
  if (!mayRaise || times <= MOST_TIMES) return "";
  return ` A larger charge does not help (${times > 1000 ? "over 1000" : trimmed(times, 2)} times as much): use less water or alcohol, or add the partner first.`;
}
