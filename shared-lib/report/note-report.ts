/** The report of a note with its steps: what each was taken for, its ledger, and how each figure was reached. */

import { contextOf } from "../advice/context.ts";
import { ledgerOf } from "../advice/ledger/build.ts";
import type { CarbonylView, StepView } from "../advice/types.ts";
import type { Analysis } from "../analyze.ts";
import type { Lexicon } from "../compounds/lexicon.ts";
import type { Interval } from "../model/contract.ts";
import { DEFAULT_SETTINGS, type Settings } from "../model/settings.ts";
import { toFileReport } from "./file-report.ts";
import type { CarbonylReport, NoteReport, StepReport } from "./types.ts";

/** Bounds of a product of two quantities known independently, on the safe side: ends with ends. */
function times(a: Interval, b: Interval): Interval {
  return { value: a.value * b.value, low: a.low * b.low, high: a.high * b.high };
}

function carbonylOf({ charge, forms }: CarbonylView): CarbonylReport {
  const assessed = forms.outside === undefined && forms.forms.length > 0;
  return {
    mention: charge.mention,
    charge: charge.charge,
    forms: forms.forms,
    free: forms.free,
    ...(charge.total && assessed ? { freeAmount: times(charge.total, forms.free) } : {}),
    ...(forms.time ? { halfLife: forms.time.halfLife } : {}),
    derivation: forms.derivation,
    cautions: forms.cautions,
    ...(forms.outside === undefined ? {} : { outside: forms.outside }),
  };
}

function kindOf({ decision: { kind } }: StepView): StepReport["kind"] {
  return kind && { id: kind.id, title: kind.title, consequence: kind.consequence, source: kind.source };
}

/** `toFileReport` with the steps. `path` is the file's path, or the record's id. */
export function toNoteReport(
  path: string,
  text: string,
  analysis: Analysis,
  lexicon: Lexicon,
  settings: Settings = DEFAULT_SETTINGS,
): NoteReport {
  const { reading, charges, moments } = analysis;
  const context = contextOf({ text, reading, timeline: { charges, moments }, moments, settings, lexicon });
  const steps = context.steps.map((step): StepReport => {
    const kind = kindOf(step);
    return {
      number: step.number,
      ...(step.title ? { title: step.title } : {}),
      ...(kind ? { kind } : {}),
      kindFrom: step.decision.by,
      ledger: ledgerOf(context, step),
      carbonyls: context.carbonyls.filter((view) => view.step === step).map(carbonylOf),
    };
  });
  return { ...toFileReport(path, analysis), steps };
}
