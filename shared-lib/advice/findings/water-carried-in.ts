/** A carbonyl charge brings water or alcohol into a step whose partner it destroys. */

import type { SuppliedForm } from "../../compounds/types.ts";
import { solventByKey } from "../../media/solvents.ts";
import { amountText, trimmed } from "../figures.ts";
import { switchForm } from "../fixes/switch-form.ts";
import { sensitivePartners } from "../ledger/sensitive.ts";
import type { AdviceContext, CarbonylView, FindingRule, RawFinding } from "../types.ts";

/** Less than this share of the partner is within its usual excess (common practice, no source). */
const LEAST_SHARE = 0.05;

/** Paraformaldehyde's few per cent of end groups count as dry here. */
function isDry(form: SuppliedForm): boolean {
  const wet = form.carries.reduce((sum, part) => sum + part.massFraction, 0);
  return form.boundWater === 0 && wet < 0.1 && form.release !== "needs acid or base" && form.kind !== "hemiacetal";
}

function lookAt(context: AdviceContext, view: CarbonylView): readonly RawFinding[] {
  const partners = sensitivePartners(view.step.charges);
  const partner = partners[0];
  if (!partner || view.charge.form?.kind === "polymer") return [];
  const carried = view.charge.brings.filter(({ solvent }) => solventByKey(solvent)?.nucleophile !== "none");
  const mol = carried.reduce((sum, row) => sum + row.amount, 0);
  const reagent = partner.total?.value;
  if (!(mol > 0) || (reagent !== undefined && mol / reagent < LEAST_SHARE)) return [];
  const names = carried.map((row) => `${amountText(row.amount)} of ${row.solvent}`).join(" and ");
  const against = reagent === undefined ? "" : `, ${trimmed(mol / reagent, 2)} equiv of ${partner.compound.name}`;
  const label = view.charge.form?.label ?? view.charge.compound.name;
  const message = `${label} brings ${names}${against}: ${partner.compound.name} is destroyed by it; take a dry form, or dry it first.`;
  const fixes = switchForm(context, view, isDry);
  return [{ start: view.mention.start, end: view.mention.end, mention: view.charge.mention, message, fixes }];
}

export const waterCarriedIn: FindingRule = {
  code: "medium/water-carried-in",
  severity: "note",
  title: "A solution or hydrate brings water or alcohol to a partner that it destroys",
  page: `**Looks for** an organometallic reagent, a strong hydride or an ylide in the same step as a carbonyl charge that is a hydrate, a hemiacetal or a
solution in water or alcohol, and counts what it brings against the partner.

**Keeps silent** on the few per cent of water in paraformaldehyde, below 0.05 equivalents of the partner, in steps whose partner stands water, and on water that a work-up adds.

**Why.** Each mol of O-H uses up one mol of such a reagent before it adds. Such a quench can be violent: the safety data sheet, local
rules and trained staff decide how it is done.

**Corrections.** Another supplied form without water, where one is known.

**Sources.** Water of each form from the table of supplied forms; the reaction is common practice, no source.`,
  look: (context) => context.carbonyls.flatMap((view) => lookAt(context, view)),
};
