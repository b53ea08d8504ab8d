/** Stabilised formalin brings methanol where methanol counts. */

import { amountText, percent } from "../figures.ts";
import { switchForm } from "../fixes/switch-form.ts";
import type { AdviceContext, CarbonylView, FindingRule, RawFinding } from "../types.ts";

function reasonFor(view: CarbonylView): string | undefined {
  const tags = new Set(view.step.charges.flatMap((charge) => charge.compound.tags));
  if (tags.has("protein")) return "methanol precipitates and extracts; fixatives are made without it";
  if (tags.has("strong acid")) return "with acid it makes dimethoxymethane, and formaldehyde is lost to it";
  const others = view.moment.carbonylMentions.some((mention) => mention !== view.charge.mention);
  return others ? "the other carbonyl compound in the flask meets it too" : undefined;
}

function lookAt(context: AdviceContext, view: CarbonylView): readonly RawFinding[] {
  const { charge, mention, moment } = view;
  if (!charge.form || !charge.compound.carbonyl?.sites.some((site) => site.hydrogens === 2)) return [];
  const carried = charge.brings
    .filter(({ solvent }) => solvent === "methanol")
    .reduce((sum, row) => sum + row.amount, 0);
  const reason = reasonFor(view);
  const inFlask = moment.contents.solvents.find(({ solvent }) => solvent === "methanol")?.amount ?? 0;
  if (!(carried > 0) || !reason || carried < inFlask / 2) return [];
  const share = charge.total ? ` (${percent(carried / charge.total.value)} of the formaldehyde)` : "";
  const message = `${charge.form.label} brings ${amountText(carried)} of methanol${share}: ${reason}.`;
  const fixes = switchForm(context, view, (form) => form.kind === "polymer");
  return [{ start: mention.start, end: mention.end, mention: charge.mention, message, fixes }];
}

export const methanolFromFormalin: FindingRule = {
  code: "medium/methanol-from-formalin",
  severity: "hint",
  title: "Stabilised formalin brings methanol into a step where it counts",
  page: `**Looks for** a charge of formaldehyde as methanol-stabilised solution in a step with a protein, a strong acid or another carbonyl compound,
and says how much methanol comes with it.

**Keeps silent** where methanol is a solvent of the step anyway, and where nothing in the flask minds it.

**Why.** Stabilised formalin holds 9 to 15 % of methanol, a third of a mol for each mol of formaldehyde.

**Corrections.** Paraformaldehyde for the same amount.

**Sources.** USP monograph, formaldehyde solution (9.0 to 15.0 % methanol).`,
  look: (context) => context.carbonyls.flatMap((view) => lookAt(context, view)),
};
