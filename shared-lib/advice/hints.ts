/** Short labels beside carbonyl charges. */

import type { FormKind } from "../model/contract.ts";
import { percent } from "./figures.ts";
import type { AdviceContext, CarbonylView, Hint } from "./types.ts";

const LONGEST_LABEL = 24;
/** A bound share above this changes a charge by more than weighing does (common practice, no source). */
const NOTABLE_SHARE = 0.1;

const NOUNS: Readonly<Record<FormKind, string>> = {
  "free carbonyl": "free",
  hydrate: "hydrate",
  "hydrate anion": "hydrate anion",
  hemiacetal: "hemiacetal",
  "cyclic hemiacetal": "ring-closed",
  enol: "enol",
  oligomer: "oligomer",
  "iminium or imine": "imine",
  other: "bound otherwise",
};

/** One label a carbonyl charge, if the settings want it. */
export function hintsOf(context: AdviceContext): readonly Hint[] {
  const { hints } = context.settings;
  if (hints === "off") return [];
  return context.carbonyls.flatMap((view) => {
    const label = labelOf(view);
    if (!label || (hints === "notable" && 1 - view.forms.free.value < NOTABLE_SHARE)) return [];
    return [{ offset: view.mention.end, label, mention: view.charge.mention, moment: view.momentIndex }];
  });
}

function labelOf(view: CarbonylView): string | undefined {
  let largest = view.forms.forms[0];
  if (!largest) return undefined;
  const bound = view.forms.forms.filter((form) => form.kind !== "free carbonyl");
  const sum = bound.reduce((all, form) => all + form.fraction.value, 0);
  if (sum < NOTABLE_SHARE) return `${percent(view.forms.free.value)} free`;
  largest = bound.reduce((most, form) => (form.fraction.value > most.fraction.value ? form : most));
  const same = bound.filter((form) => form.kind === largest.kind);
  const share = same.reduce((all, form) => all + form.fraction.value, 0);
  return `${percent(share)} ${NOUNS[largest.kind]}`.slice(0, LONGEST_LABEL);
}
