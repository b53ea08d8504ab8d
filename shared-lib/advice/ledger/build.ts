/** The ledger of each step, from what was charged and the forms it takes. */

import { writtenQuantities } from "../../flask/charge-quantities.ts";
import { materialOf } from "../../flask/charge-total.ts";
import { countsAsSolvent } from "../../flask/resolve-charges.ts";
import type { ResolvedCharge } from "../../flask/types.ts";
import { molesInVolume, solventByKey } from "../../media/solvents.ts";
import type { Interval } from "../../model/contract.ts";
import type { AdviceContext, CarbonylView, StepView } from "../types.ts";
import { sensitivePartners } from "./sensitive.ts";
import type { LedgerRow, StepLedger, WaterOfStep } from "./types.ts";

const WATER = solventByKey("water");

/** Ledger of one step. Figures that do not follow from the note are absent, never zero. */
export function ledgerOf(context: AdviceContext, step: StepView): StepLedger {
  const views = new Map(
    context.carbonyls.filter((view) => view.step === step).map((view) => [view.charge.charge, view]),
  );
  const rows = step.charges.filter((charge) => !countsAsSolvent(charge.compound) || charge.equivalents !== undefined);
  const water = waterOf(context, step);
  const wet = water.asSolvent + water.asHydrate + water.inSolutions;
  const { kind } = step.decision;
  return {
    step: step.number,
    ...(step.title ? { title: step.title } : {}),
    ...(kind ? { kind: kind.title } : {}),
    ...(step.equivalent ? { equivalentMol: step.equivalent.mol, countedBy: step.equivalent.by } : {}),
    rows: rows.map((charge) => rowOf(context, step, charge, views.get(charge.charge))),
    solvents: (step.decisive?.contents.solvents ?? []).flatMap(({ solvent: key, amount }) => {
      const solvent = solventByKey(key);
      return solvent ? [{ name: solvent.name, volumeL: amount / molesInVolume(solvent, 1), amount }] : [];
    }),
    water,
    waterAgainst: sensitivePartners(step.charges).flatMap(({ compound, total }) =>
      total && total.value > 0 ? [{ partner: compound.name, equivalents: wet / total.value }] : [],
    ),
  };
}

function rowOf(
  context: AdviceContext,
  step: StepView,
  charge: ResolvedCharge,
  view: CarbonylView | undefined,
): LedgerRow {
  const written = context.reading.charges[charge.charge];
  const quantities = written ? writtenQuantities(written) : {};
  const { density } = materialOf(charge.compound, charge.form, quantities);
  const assay = quantities.assay?.base ?? charge.form?.assay?.value;
  const carried = (nucleophile: "water" | "alcohol") =>
    charge.brings
      .filter(({ solvent }) => solventByKey(solvent)?.nucleophile === nucleophile)
      .reduce((sum, row) => sum + row.amount, 0);
  const one = step.equivalent?.mol;
  const free =
    view && charge.total && one && view.forms.forms.length > 0
      ? product(charge.total, view.forms.free, one)
      : undefined;
  return {
    name: charge.compound.name,
    ...(charge.form ? { form: charge.form.label } : {}),
    formIs: charge.formIs,
    ...(assay === undefined ? {} : { assay }),
    ...(density === undefined ? {} : { density }),
    ...(charge.massG === undefined ? {} : { massG: charge.massG }),
    ...(charge.volumeL === undefined ? {} : { volumeL: charge.volumeL }),
    ...(charge.total ? { amount: charge.total } : {}),
    ...(charge.equivalents === undefined ? {} : { equivalents: charge.equivalents }),
    ...(free ? { freeEquivalents: free } : {}),
    limiting: step.equivalent?.charge === charge.charge,
    water: carried("water"),
    alcohol: carried("alcohol"),
  };
}

/** Bounds of a product of two independent figures: never too narrow. */
function product(total: Interval, share: Interval, one: number): Interval {
  return {
    value: (total.value * share.value) / one,
    low: (total.low * share.low) / one,
    high: (total.high * share.high) / one,
  };
}

function waterOf(context: AdviceContext, step: StepView): WaterOfStep {
  let asHydrate = 0;
  let carried = 0;
  for (const { brings, form, total } of step.charges) {
    for (const row of brings) if (row.solvent === "water") carried += row.amount;
    asHydrate += (form?.boundWater ?? 0) * (total?.value ?? 0);
  }
  const solvents = step.decisive?.contents.solvents ?? [];
  const inFlask = solvents.find(({ solvent }) => solvent === "water")?.amount ?? 0;
  return {
    asSolvent: Math.max(0, inFlask - carried),
    asHydrate,
    inSolutions: Math.max(0, carried - asHydrate),
    inSolventGrade: solvents.reduce((sum, row) => sum + gradeWater(context, step, row), 0),
  };
}

const DRY_WORDS = ["dry", "anhydrous", "absolute", "sieves"];

/** mol of water in an opened bottle of a solvent, unless the note calls it dry. */
function gradeWater(
  context: AdviceContext,
  step: StepView,
  row: { readonly solvent: string; readonly amount: number },
): number {
  const solvent = solventByKey(row.solvent);
  if (!solvent || !WATER || solvent.bottleWater <= 0) return 0;
  const words = context.reading.media
    .filter((phrase) => phrase.step === step.number)
    .flatMap((phrase) => [
      context.text.slice(Math.max(0, phrase.start - 12), phrase.end),
      ...phrase.parts.map((part) => part.words),
    ]);
  if (words.some((word) => DRY_WORDS.some((dry) => word.toLowerCase().includes(dry)))) return 0;
  return (row.amount * solvent.molarMass * solvent.bottleWater) / WATER.molarMass;
}
