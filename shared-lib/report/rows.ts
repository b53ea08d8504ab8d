/** What the page formats say of a note, in words, before any format's signs. */

import { percentWithBounds } from "../advice/figures.ts";
import type { Consequence } from "../advice/step-kinds/types.ts";
import type { FormShare } from "../model/contract.ts";
import { lineStartsOf, placeOf } from "./line-table.ts";
import type { CarbonylReport, NoteOnFile, StepReport } from "./types.ts";

/** Forms below this share are left out of a listing. */
const LEAST_SHARE = 0.005;

/** "54 % (48 to 60) gem-diol hydrate; 46 % (40 to 52) free carbonyl", the largest first. */
export function formsInWords(forms: readonly FormShare[]): string {
  const listed = forms.filter((form) => form.fraction.value >= LEAST_SHARE);
  return [...listed]
    .sort((a, b) => b.fraction.value - a.fraction.value)
    .map((form) => `${percentWithBounds(form.fraction)} ${form.label}`)
    .join("; ");
}

/** A charge's own words: "glyoxal, 40 wt%: 5.80 g, 100 mmol". */
export function chargeInWords({ report, text }: NoteOnFile, carbonyl: CarbonylReport): string {
  const charge = report.charges[carbonyl.charge];
  return (charge?.amounts ?? []).map((amount) => text.slice(amount.start, amount.end)).join(", ");
}

const MEANING: Readonly<Record<Consequence, string>> = {
  "free carbonyl is consumed": "equivalents stand, the free share sets the rate",
  "the step is an equilibrium": "what is bound lowers the conversion",
  "the hydrate reacts": "binding helps",
  "water destroys the partner": "the water that comes in counts against the partner",
  "the alcohol is the partner": "binding by the alcohol is the reaction itself",
  "nothing is consumed": "the next partner meets the free share",
};

/** What a step was taken for, from what, and what follows for its charges. */
export function kindInWords(step: StepReport): string {
  if (!step.kind) return "kind of step not recognised; both readings hold";
  const from = {
    directive: "by the note's directive",
    partners: "by its partners",
    title: "by its title",
    nothing: "",
  };
  return `taken as: ${step.kind.title} (${from[step.kindFrom]}); ${MEANING[step.kind.consequence]}`;
}

/** Its title as written, else "Step 2". */
export function stepName(step: StepReport): string {
  return step.title ?? `Step ${step.number}`;
}

/** Gives lines and columns of a note's offsets. */
export function placesOf(text: string): (offset: number) => { readonly line: number; readonly column: number } {
  const starts = lineStartsOf(text);
  return (offset) => placeOf(starts, offset);
}
