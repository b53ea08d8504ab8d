/** The next reagent comes before the carbonyl has reached the forms that the margin shows. */

import { timeText } from "../figures.ts";
import { holdAfterSentence } from "../fixes/hold.ts";
import type { AdviceContext, CarbonylView, FindingRule, RawFinding } from "../types.ts";

/** Half-lives to 97 % of the way. */
const HALF_LIVES = 5;
/** Longer than a day is no hold time. */
const LONGEST_HOLD_S = 86_400;
/** Less than this share bound makes no difference. */
const LEAST_BOUND = 0.2;

function lookAt(context: AdviceContext, view: CarbonylView): readonly RawFinding[] {
  const { step, charge, mention } = view;
  const index = step.moments.findIndex(
    (moment) => moment.carbonylMentions.includes(charge.mention) && moment.heldSeconds !== undefined,
  );
  const moment = step.moments[index];
  const held = moment?.heldSeconds;
  if (!moment || held === undefined || moment.contents.solvents.length === 0) return [];
  const next = step.moments.slice(index + 1).find((later) => context.reading.events[later.event]?.kind === "charge");
  const forms = moment.speciation.carbonyls[moment.carbonylMentions.indexOf(charge.mention)];
  if (!next || !forms?.time || 1 - forms.free.value < LEAST_BOUND) return [];
  if (charge.form && charge.form.kind !== "neat" && charge.form.kind !== "solution") return [];
  const needed = HALF_LIVES * forms.time.halfLife.value;
  if (held >= 2 * forms.time.halfLife.low || needed > LONGEST_HOLD_S) return [];
  const message = `${charge.compound.name} needs about ${timeText(needed)} here to reach equilibrium (half-life ${timeText(forms.time.halfLife.value)}), and the next charge comes after ${timeText(held)}.`;
  const event = context.reading.events[moment.event];
  const hold = event ? holdAfterSentence(context.text, event.end, needed) : undefined;
  const fixes = hold ? [{ title: `Add a hold of ${timeText(needed)}`, edits: [hold], safe: false }] : [];
  return [{ start: mention.start, end: mention.end, mention: charge.mention, message, fixes }];
}

export const notAtEquilibrium: FindingRule = {
  code: "time/not-at-equilibrium",
  severity: "hint",
  title: "The next charge comes before the carbonyl has reached equilibrium",
  page: `**Looks for** a written hold time, followed by another charge, that is shorter than two half-lives (lower bound) of hydration or
hemiacetal formation at that pH and temperature, where at least a fifth of the compound becomes bound.

**Keeps silent** when no time is written, when no rate is known, and for compounds weighed as a hydrate.

**Why.** Far from acid and base, hydration takes minutes to hours; until then more is free than the margin shows.

**Corrections.** A hold of five half-lives, up to a day.

**Sources.** Rate constants are cited in the card of the compound.`,
  look: (context) => context.carbonyls.flatMap((view) => lookAt(context, view)),
};
