/** Mass, volume, amount and equivalents of one charge do not say the same. */

import { writtenQuantities } from "../../flask/charge-quantities.ts";
import type { ResolvedCharge } from "../../flask/types.ts";
import { amountText, trimmed } from "../figures.ts";
import { COUNTED, scaleCharge, WEIGHED } from "../fixes/scale-charge.ts";
import type { AdviceContext, FindingRule, RawFinding, SafeFix, StepView } from "../types.ts";
import { agrees, countedWhole, neededText, roundingOf, type Weighing, weighedAs, weighingOf } from "../weighing.ts";

/** Without a slip that explains it, figures must differ by more than lots and rounding do (common practice, no source). */
const UNEXPLAINED = 0.2;
const EXPLAINED = 0.1;

interface Slip {
  readonly says: string;
}

const POWERS_OF_1000 = [1000, 1e-3, 1e6, 1e-6];
/** A decimal sign in the wrong place; of a carbonyl compound only, because more than the name must be read right for it. */
const POWERS_OF_10 = [10, 0.1];

/** The likely slip behind a weighing that does not fit its amount. */
function slipOf(context: AdviceContext, charge: ResolvedCharge, weighing: Weighing): Slip | undefined {
  const { meant, holds, massG, rounding, gramsPerMole } = weighing;
  const fits = (mol: number) => agrees(mol, meant, rounding, 0.02);
  if (POWERS_OF_1000.some((factor) => fits(holds * factor))) return { says: "a factor of 1000 between the units" };
  const { compound, form } = charge;
  if (!compound.carbonyl) return undefined;
  if (POWERS_OF_10.some((factor) => fits(holds * factor))) return { says: "a decimal sign in the wrong place" };
  const perMole = form?.massPerMole ?? compound.molarMass;
  const hasAssay = !agrees(perMole, gramsPerMole, 0, 0.01);
  if (hasAssay && fits(massG / perMole)) return { says: "the assay left out" };
  if (weighing.by.of === "volume" && [perMole, gramsPerMole].some((grams) => fits((weighing.by.base * 1000) / grams))) {
    return { says: "the density left out (millilitres taken as grams)" };
  }
  const other = context.lexicon
    ?.formsOf(compound.id)
    .find(
      ({ id, massPerMole }) => id !== form?.id && !agrees(massPerMole, perMole, 0, 0.02) && fits(massG / massPerMole),
    );
  return other ? { says: `the molar mass of ${other.label}` } : undefined;
}

function lookAtWeighing(context: AdviceContext, step: StepView, charge: ResolvedCharge): readonly RawFinding[] {
  const mention = context.reading.mentions[charge.mention];
  const weighing = weighingOf(context, step, charge);
  if (mention?.role !== "reagent" || !weighing || weighing.meantBy !== "amount") return [];
  if (agrees(weighing.holds, weighing.meant, weighing.rounding, EXPLAINED)) return [];
  if (
    countedWhole(context, weighing, charge) ||
    (charge.compound.carbonyl && weighedAs(context, weighing, charge) !== undefined)
  )
    return [];
  const slip = slipOf(context, charge, weighing);
  if (!slip && !speaksWithoutSlip(charge, weighing)) return [];
  const because = slip ? `; the likely slip is ${slip.says}` : "";
  const needed = neededText(weighing);
  const message = `${weighing.by.text} of ${charge.compound.name} is ${amountText(weighing.holds)}, not ${amountText(weighing.meant)} (which is ${needed})${because}.`;
  const fixes = slip ? fixesOf(context, weighing, needed) : [];
  return [{ start: mention.start, end: mention.end, mention: charge.mention, message, fixes }];
}

/**
 * Too little mass for the amount. Too much says nothing: a salt, a hydrate or a longer name than was read would explain it.
 * A structure read from a name may be the misreading itself, so only compounds of the catalogue count.
 */
function speaksWithoutSlip({ compound, formIs }: ResolvedCharge, { holds, meant, rounding }: Weighing): boolean {
  if (!compound.carbonyl || compound.solvent || compound.origin !== "catalogue" || formIs === "assumed") return false;
  return holds < meant && !agrees(holds, meant, rounding, UNEXPLAINED);
}

function fixesOf(context: AdviceContext, weighing: Weighing, needed: string): readonly SafeFix[] {
  const fixes: SafeFix[] = [];
  const weighed = scaleCharge(context.text, weighing.written, WEIGHED, weighing.meant / weighing.holds);
  if (weighed) fixes.push({ title: `Take ${needed}, and keep the amount`, edits: weighed, safe: false });
  const counted = scaleCharge(context.text, weighing.written, COUNTED, weighing.holds / weighing.meant);
  if (counted)
    fixes.push({ title: `Keep what is weighed: it is ${amountText(weighing.holds)}`, edits: counted, safe: false });
  return fixes;
}

/** Equivalents against the amount, on the writer's own count of one equivalent. */
function lookAtEquivalents(context: AdviceContext, step: StepView, charge: ResolvedCharge): readonly RawFinding[] {
  const one = step.equivalent;
  const written = context.reading.charges[charge.charge];
  const mention = context.reading.mentions[charge.mention];
  if (one?.by !== "written" || one.charge === charge.charge || !written || !mention) return [];
  const { amount, equivalents } = writtenQuantities(written);
  if (!amount || !equivalents || [amount, equivalents].some((row) => row.approximate || row.range)) return [];
  const rounding = roundingOf(context.text, amount) + roundingOf(context.text, equivalents);
  const meant = equivalents.base * one.mol;
  if (agrees(meant, amount.base, rounding, EXPLAINED)) return [];
  const place = { start: mention.start, end: mention.end, mention: charge.mention };
  if (agreeingCounts(context, step) < 2) {
    if (equivalents.base !== 1) return [];
    const message = `${amount.text} of ${charge.compound.name} and ${amountText(one.mol)} of another charge are both written as 1 equiv.`;
    return [{ ...place, message, fixes: [] }];
  }
  const actual = trimmed(amount.base / one.mol, 3);
  const message = `${amount.text} of ${charge.compound.name} is ${actual} equiv of ${amountText(one.mol)}, not ${equivalents.text}.`;
  const fix = scaleCharge(context.text, written, ["equivalents"], amount.base / meant);
  const fixes = fix ? [{ title: `Keep the amount: it is ${actual} equiv`, edits: fix, safe: false }] : [];
  return [{ ...place, message, fixes }];
}

/** A step has no more charges than this; a longer list is no step. */
const MOST_COUNTED = 50;

/** Number of charges that agree on what one equivalent is; with fewer than two nobody knows which of them is off. */
function agreeingCounts({ reading }: AdviceContext, { charges, equivalent }: StepView): number {
  return charges.slice(0, MOST_COUNTED).filter(({ charge }) => {
    const source = reading.charges[charge];
    const { amount, equivalents } = source ? writtenQuantities(source) : {};
    return amount && equivalents && equivalent && agrees(amount.base / equivalents.base, equivalent.mol, 0, EXPLAINED);
  }).length;
}

export const amountsDisagree: FindingRule = {
  code: "charge/amounts-disagree",
  severity: "note",
  title: "Mass, volume, amount and equivalents of one charge do not agree",
  page: `**Looks for** a charge whose mass or volume gives another amount than the one written, or whose amount gives other equivalents than written,
and names the likely slip: a factor of 1000, a decimal sign, the assay or the density left out, the molar mass of another form.

**Keeps silent** within 10 % and what the written digits allow; for ranges and approximate figures; when the amount counts whole dimers or trimers;
for other compounds than aldehydes and ketones, unless it is a factor of 1000. Without a slip that explains it, it speaks only if the mass
is more than 20 % too small: a salt, a hydrate or a longer name than was read would explain too much mass.

**Corrections** are offered only where a slip explains the difference: keep the amount and weigh accordingly, or keep what is weighed.

**Sources.** Molar masses from formulas; densities from the catalogue.`,
  look: (context) =>
    context.steps.flatMap((step) =>
      step.charges.flatMap((charge) => {
        const found = lookAtWeighing(context, step, charge);
        return found.length > 0 ? found : lookAtEquivalents(context, step, charge);
      }),
    ),
};
