/** An oligomer is charged under conditions in which it does not give the free compound. */

import { timeText } from "../figures.ts";
import { holdAfterSentence } from "../fixes/hold.ts";
import type { AdviceContext, CarbonylView, FindingRule, RawFinding } from "../types.ts";

/** Paraformaldehyde goes into solution within an hour or so from about here on (common practice, no source). */
const WARM_K = 273.15 + 50;
/** Dimers and trimers of hydroxy-aldehydes and glyoxal come apart within hours in water (common practice, no source). */
const SLOW_RELEASE_S = 3 * 3600;

function lacking(view: CarbonylView): string | undefined {
  const { form } = view.charge;
  const tags = new Set(view.step.charges.flatMap((charge) => charge.compound.tags));
  const acid = tags.has("strong acid") || tags.has("acid") || tags.has("catalyst");
  const acidOrBase = acid || tags.has("base") || tags.has("ammonia");
  const moments = view.step.moments.filter((moment) => moment.carbonylMentions.includes(view.charge.mention));
  const warmest = Math.max(0, ...moments.map((moment) => moment.contents.temperatureK));
  const held = moments.reduce((sum, moment) => sum + (moment.heldSeconds ?? 0), 0);
  switch (form?.release) {
    case "needs acid or base":
      return acid ? undefined : "needs acid to come apart, and none is charged";
    case "on heating":
      return warmest >= WARM_K || acidOrBase || [...tags].some((tag) => tag.endsWith("amine"))
        ? undefined
        : "needs heat or base, and the flask stays cool";
    case "slow":
      return held === 0 || held >= SLOW_RELEASE_S
        ? undefined
        : `comes apart over hours, and the note gives it ${timeText(held)}`;
    default:
      return undefined;
  }
}

function lookAt(context: AdviceContext, view: CarbonylView): readonly RawFinding[] {
  const { charge, mention } = view;
  const { form } = charge;
  if (!form || charge.formIs !== "written" || (form.kind !== "oligomer" && form.kind !== "polymer")) return [];
  if (view.moment.contents.solvents.length === 0) return [];
  const lacks = lacking(view);
  if (!lacks) return [];
  const event = context.reading.events[view.moment.event];
  const hold =
    form.release === "slow" && event ? holdAfterSentence(context.text, event.end, SLOW_RELEASE_S) : undefined;
  const fixes = hold ? [{ title: `Add a hold of ${timeText(SLOW_RELEASE_S)}`, edits: [hold], safe: false }] : [];
  const message = `${form.label} ${lacks}: most of the ${charge.compound.name} may still be bound in it.`;
  return [{ start: mention.start, end: mention.end, mention: charge.mention, message, fixes }];
}

export const oligomerNotReleased: FindingRule = {
  code: "forms/oligomer-not-released",
  severity: "note",
  title: "An oligomer or polymer is charged that is not released under these conditions",
  page: `**Looks for** a charge named as an oligomer or polymer (paraformaldehyde, trioxane, paraldehyde, dimers and trimers) in a step without what releases
it: heat, acid or base, or hours of time.

**Keeps silent** when the step is warmed to 50 °C or more, an acid or base is charged, or no time is written for a slow one; and when the oligomer is
only the form that the bottle usually holds.

**Corrections.** A hold of three hours for a form that comes apart slowly.

**Sources.** Table of supplied forms; temperatures and times are common practice, no source.`,
  look: (context) => context.carbonyls.flatMap((view) => lookAt(context, view)),
};
