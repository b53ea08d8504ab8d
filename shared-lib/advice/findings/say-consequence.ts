/** What a bound share means for a charge, in words, and what may be done about it. */

import type { Severity } from "../../model/contract.ts";
import { conversionLoss, ownFree } from "../conversion.ts";
import { percent, trimmed } from "../figures.ts";
import { besideEdit } from "../fixes/beside.ts";
import { HOW_MUCH, scaleCharge } from "../fixes/scale-charge.ts";
import type { AdviceContext, CarbonylView, SafeFix } from "../types.ts";

/** More than this many times the charge is no correction any more. */
const MOST_TIMES = 3;
/** And from here on it is absurd. */
const ABSURD_TIMES = 10;
/** Below this free share the rate falls so far that the time of a step has to follow. */
const SLOW_SHARE = 0.1;

export interface SaidConsequence {
  readonly severity: Severity;
  readonly says: string;
  /** A larger charge is one of the answers. */
  readonly mayRaise: boolean;
}

/** A loss of conversion below this is within the error of yields (common practice, no source). */
const LEAST_LOSS = 0.05;

const REFILLED = "equivalents stand, because the free share is made good as it is used up";
const KEEP = "more equivalents or less of what binds it keep the conversion";

/**
 * @returns undefined when nothing would be changed, so that nothing needs saying
 */
export function consequenceOf(context: AdviceContext, view: CarbonylView): SaidConsequence | undefined {
  const { kind } = view.step.decision;
  const free = ownFree(view);
  const rate = `the rate falls to ${percent(free)} of that without binding`;
  const title = kind?.title ?? "";
  if (context.settings.basis === "free") {
    return { severity: "note", says: "The note counts equivalents in free carbonyl", mayRaise: true };
  }
  if (!kind) {
    return {
      severity: boughtBound(view) ? "hint" : "note",
      says: `If the step uses it up irreversibly, equivalents stand and ${rate}; if it is an equilibrium, ${KEEP}`,
      mayRaise: true,
    };
  }
  switch (kind.consequence) {
    case "free carbonyl is consumed":
      return free < SLOW_SHARE
        ? { severity: "hint", says: `${title}: ${REFILLED}; ${rate}`, mayRaise: false }
        : undefined;
    case "the step is an equilibrium":
      return ofEquilibrium(view, title);
    case "nothing is consumed":
      return { severity: "note", says: `${title}: the next partner meets only the free share`, mayRaise: true };
    case "water destroys the partner":
      return {
        severity: "note",
        says: `${title}: each bound O-H uses up the reagent; dry the carbonyl compound or the solvent first`,
        mayRaise: false,
      };
    default:
      return undefined;
  }
}

/** Bought as hydrate, hemiacetal, oligomer or in water: it was bound before, and its users know. */
function boughtBound({ charge }: CarbonylView): boolean {
  return charge.form !== undefined && charge.form.kind !== "neat";
}

/** An equilibrium far on the side of the product loses nothing that matters; then nothing needs saying. */
function ofEquilibrium(view: CarbonylView, title: string): SaidConsequence | undefined {
  const loss = conversionLoss(view);
  if (loss && loss.most < LEAST_LOSS) return undefined;
  const range = loss
    ? `: its conversion falls from ${percent(loss.without)} to ${percent(loss.bound)} for a usual constant, by at most ${Math.round(loss.most * 100)} points`
    : "";
  return {
    severity: "note",
    says: `${title} is an equilibrium${range}; ${KEEP}`,
    mayRaise: !loss || loss.without - loss.bound >= LEAST_LOSS,
  };
}

/** The corrections that a bound share calls for. */
export function fixesForBound(context: AdviceContext, view: CarbonylView, mayRaise: boolean): readonly SafeFix[] {
  const { text } = context;
  const fixes: SafeFix[] = [];
  const times = 1 / ownFree(view);
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

function remedy(view: CarbonylView): string {
  const ring = view.forms.forms.find((form) => form.kind === "cyclic hemiacetal");
  if (ring && ring.fraction.value > 0.5) return "the ring opens as the partner takes the rest";
  return "use less water or alcohol, or let the partner take the water away";
}

/** Said instead of a larger charge that would be too large, or absurd. */
export function insteadOfRaising(view: CarbonylView, mayRaise: boolean): string {
  const times = 1 / ownFree(view);
  if (!mayRaise || times <= MOST_TIMES) return "";
  const larger = `${times > 1000 ? "over 1000" : trimmed(times, 2)} times as much`;
  const says =
    times <= ABSURD_TIMES
      ? `To keep the free amount would take ${larger}`
      : `A larger charge does not help (${larger})`;
  return ` ${says}: ${remedy(view)}.`;
}
