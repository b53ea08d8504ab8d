/** Which form of a compound was weighed or measured out. */

import type { Lexicon } from "../compounds/lexicon.ts";
import type { Compound, SuppliedForm } from "../compounds/types.ts";
import type { Charge, Mention } from "../notes/types.ts";
import { writtenQuantities } from "./charge-quantities.ts";

export interface WeighedForm {
  readonly form?: SuppliedForm;
  readonly formIs: "written" | "assumed";
}

/** Above this mass fraction an assay is the purity of the neat compound, not the strength of a solution. */
const NEAT_ASSAY = 0.85;

/**
 * The form that the words say; else the solution whose strength is nearest to a written assay; else the form that the
 * bottle usually holds, which is only assumed.
 */
export function weighedForm(mention: Mention, charge: Charge, compound: Compound, lexicon?: Lexicon): WeighedForm {
  if (mention.form) return { form: mention.form, formIs: "written" };
  const forms = lexicon?.formsOf(compound.id) ?? [];
  const assay = writtenQuantities(charge).assay?.base;
  if (assay !== undefined && assay < NEAT_ASSAY) {
    const solution = nearestSolution(forms, assay);
    if (solution) return { form: solution, formIs: "written" };
  }
  if (charge.dissolvedIn && charge.dissolvedIn.length > 0) return { formIs: "written" };
  const usual = compound.usualForm ? forms.find((form) => form.id === compound.usualForm) : undefined;
  return usual ? { form: usual, formIs: "assumed" } : { formIs: "written" };
}

function nearestSolution(forms: readonly SuppliedForm[], assay: number): SuppliedForm | undefined {
  let nearest: SuppliedForm | undefined;
  let distance = Number.POSITIVE_INFINITY;
  for (const form of forms) {
    if (form.kind !== "solution" || !form.assay) continue;
    const apart = Math.abs(Math.log(form.assay.value / assay));
    if (apart >= distance) continue;
    nearest = form;
    distance = apart;
  }
  return nearest;
}
