/** The mass fits the free compound, but a hydrate, an oligomer, a hemiacetal or a solution of it was weighed. */

import type { ResolvedCharge } from "../../flask/types.ts";
import type { Severity } from "../../model/contract.ts";
import { amountText } from "../figures.ts";
import { COUNTED, scaleCharge, WEIGHED } from "../fixes/scale-charge.ts";
import type { AdviceContext, FindingRule, RawFinding, SafeFix, StepView } from "../types.ts";
import { neededText, type Weighing, weighedAs, weighingOf } from "../weighing.ts";

const NO_SOURCE = "common practice";

function lookAt(context: AdviceContext, step: StepView, charge: ResolvedCharge): readonly RawFinding[] {
  const { form, compound, formIs } = charge;
  const mention = context.reading.mentions[charge.mention];
  const weighing = weighingOf(context, step, charge);
  if (!form || !mention || !weighing || weighedAs(context, weighing, charge) === undefined) return [];
  const needs = neededText(weighing);
  const name = form.label === compound.name ? `the ${form.kind}` : form.label;
  const [holds, meant] = [amountText(weighing.holds), amountText(weighing.meant)];
  const message =
    formIs === "written"
      ? `${weighing.by.text} of ${name} holds ${holds} of ${compound.name}, not ${meant}: that takes ${needs}.`
      : `${weighing.by.text} is ${meant} only as pure ${compound.name}; as ${name}, the usual form, it holds ${holds}: ${meant} takes ${needs}.`;
  const severity = severityOf(charge);
  const fixes = fixesOf(context, weighing, needs, formIs);
  return [{ start: mention.start, end: mention.end, mention: charge.mention, severity, message, fixes }];
}

/** A form that is only assumed is a hint, unless it is a solution: those compounds are not sold pure. */
function severityOf({ form, formIs }: ResolvedCharge): Severity {
  if (formIs === "assumed") return form?.kind === "solution" ? "note" : "hint";
  return form && !form.source.startsWith(NO_SOURCE) ? "warning" : "note";
}

function fixesOf(
  context: AdviceContext,
  weighing: Weighing,
  needs: string,
  formIs: "written" | "assumed",
): readonly SafeFix[] {
  const fixes: SafeFix[] = [];
  const more = scaleCharge(context.text, weighing.written, WEIGHED, weighing.meant / weighing.holds);
  const safe = formIs === "written" && weighing.backed;
  if (more) fixes.push({ title: `Take ${needs}, and keep the amount`, edits: more, safe });
  const counted = scaleCharge(context.text, weighing.written, COUNTED, weighing.holds / weighing.meant);
  if (counted) {
    const title = `Keep what is weighed: it is ${amountText(weighing.holds)}`;
    fixes.push({ title, edits: counted, safe: false });
  }
  return fixes;
}

export const weighedAsAnotherForm: FindingRule = {
  code: "charge/weighed-as-another-form",
  severity: "note",
  title: "The mass fits the free compound, but a hydrate, oligomer or solution is weighed",
  page: `**Looks for** a carbonyl charge whose mass or volume gives the written amount only with the molar mass of the free compound (or without
the assay), while the note names another form, or the bottle usually holds one: formalin, 40 wt% glyoxal, chloral hydrate, glyoxylic
acid monohydrate.

**Keeps silent** when mass and amount agree for the weighed form within 10 % (lots differ), for ranges and approximate figures, and when
only one figure is written.

**Severity.** A warning if the note names the form and its assay has a published source; else a note; a hint if a solid form is only assumed.

**Corrections.** Change mass or volume and keep the amount (safe when the written equivalents say the same amount); or keep what is
weighed and change amount and equivalents.

**Sources.** Molar masses from formulas; assay and density of each form from the table of supplied forms, with its source.`,
  look: (context) =>
    context.steps.flatMap((step) =>
      step.charges.flatMap((charge) => (charge.compound.carbonyl ? lookAt(context, step, charge) : [])),
    ),
};
