/** Puts another supplied form in the place of the one that a charge names, for the same amount of compound. */

import type { SuppliedForm } from "../../compounds/types.ts";
import type { TextEdit } from "../../model/contract.ts";
import { massText } from "../figures.ts";
import type { AdviceContext, CarbonylView, SafeFix } from "../types.ts";

const SOLID_OR_NEAT = new Set<SuppliedForm["kind"]>(["neat", "hydrate", "oligomer", "polymer", "hemiacetal"]);

/**
 * A fix for each other form that `suits`. Only where the charge says its form in one word and its mass or volume once:
 * words around it ("37 wt% aqueous") would go on speaking of the old form.
 */
export function switchForm(
  context: AdviceContext,
  view: CarbonylView,
  suits: (form: SuppliedForm) => boolean,
): readonly SafeFix[] {
  const { charge, mention, written } = view;
  const { total, form: old } = charge;
  const says = written.amounts.some(({ of }) => of === "assay" || of === "concentration" || of === "density");
  const weighed = written.amounts.filter(({ of }) => of === "mass" || of === "volume");
  const only = weighed[0];
  if (!total || !old || says || weighed.length !== 1 || !only || written.dissolvedIn?.length) return [];
  const forms = context.lexicon?.formsOf(charge.compound.id) ?? [];
  return forms
    .filter((form) => form.id !== old.id && SOLID_OR_NEAT.has(form.kind) && suits(form))
    .map((form) => {
      const grams = (total.value * form.massPerMole) / (form.assay?.value ?? 1);
      const edits: readonly TextEdit[] = [
        { start: mention.start, end: mention.end, text: form.label },
        { start: only.start, end: only.end, text: massText(grams) },
      ];
      return { title: `Use ${form.label}: ${massText(grams)}`, edits, safe: false };
    });
}
