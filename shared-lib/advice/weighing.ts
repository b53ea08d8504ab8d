/** Compares what was weighed with the amount that the writer meant. */

import { usable, writtenQuantities } from "../flask/charge-quantities.ts";
import { materialOf } from "../flask/charge-total.ts";
import type { ResolvedCharge } from "../flask/types.ts";
import type { Charge, Quantity } from "../notes/types.ts";
import { massText, volumeText } from "./figures.ts";
import type { AdviceContext, StepView } from "./types.ts";

/** Two figures of one charge that differ by less than this are one statement (common practice, no source). */
const TOLERANCE = 0.05;
/** A lot's own assay may differ this much from the table's without a word (common practice, no source). */
const ASSAY_TOLERANCE = 0.1;

/** What was weighed, what that holds, and what the writer meant by it. */
export interface Weighing {
  readonly written: Charge;
  readonly by: Quantity;
  readonly massG: number;
  /** mol that the weighed mass holds. */
  readonly holds: number;
  /** mol that the writer meant: the written amount, else the equivalents. */
  readonly meant: number;
  readonly meantBy: "amount" | "equivalents";
  /** Amount and equivalents say the same. */
  readonly backed: boolean;
  /** g that hold 1 mol, of the weighed material. */
  readonly gramsPerMole: number;
  /** Relative error that the digits of the two figures allow. */
  readonly rounding: number;
}

/** Half a unit of the last written digit, as a share of the figure. */
export function roundingOf(text: string, quantity: Quantity): number {
  const written = text.slice(quantity.number.start, quantity.number.end);
  const point = Math.max(written.lastIndexOf("."), written.lastIndexOf(","));
  const decimals = point < 0 || written.length - point - 1 > 6 ? 0 : written.length - point - 1;
  return quantity.value > 0 ? (0.5 * 10 ** -decimals) / quantity.value : 0;
}

/** @returns undefined when there are no two figures to compare, or one of them is a range or approximate */
export function weighingOf(context: AdviceContext, step: StepView, charge: ResolvedCharge): Weighing | undefined {
  const written = context.reading.charges[charge.charge];
  if (!written || written.share !== undefined || hasSeveralOfAKind(written)) return undefined;
  const quantities = writtenQuantities(written);
  const by = quantities.mass ?? quantities.volume;
  if (!by || isLoose(by)) return undefined;
  const material = materialOf(charge.compound, charge.form, quantities);
  const gramsPerMole = material.gramsPerMole.value;
  const massG = quantities.mass ? by.base : material.density ? by.base * 1000 * material.density : undefined;
  if (massG === undefined || (quantities.volume && material.molarity && !quantities.mass)) return undefined;
  const counted = meantAmount(step, charge, quantities.amount, quantities.equivalents);
  if (!counted || isLoose(counted.by)) return undefined;
  const rounding = roundingOf(context.text, by) + roundingOf(context.text, counted.by);
  const { meant, meantBy, backed } = counted;
  return { written, by, massG, holds: massG / gramsPerMole, meant, meantBy, backed, gramsPerMole, rounding };
}

function isLoose(quantity: Quantity): boolean {
  return quantity.approximate || quantity.range !== undefined;
}

/** Several masses in one charge: which belongs to which amount cannot be told. */
function hasSeveralOfAKind(written: Charge): boolean {
  const kinds = written.amounts.filter(usable).map((quantity) => quantity.of);
  return ["mass", "volume", "amount"].some((kind) => kinds.filter((of) => of === kind).length > 1);
}

function meantAmount(
  step: StepView,
  charge: ResolvedCharge,
  amount: Quantity | undefined,
  equivalents: Quantity | undefined,
):
  | {
      readonly meant: number;
      readonly meantBy: "amount" | "equivalents";
      readonly by: Quantity;
      readonly backed: boolean;
    }
  | undefined {
  const one = step.equivalent;
  const sure = one?.by === "written" && (one.charge !== charge.charge || one.agreeing > 1);
  const counted = sure && equivalents ? equivalents.base * one.mol : undefined;
  if (amount) {
    const backed = counted !== undefined && Math.abs(counted / amount.base - 1) <= TOLERANCE;
    return { meant: amount.base, meantBy: "amount", by: amount, backed };
  }
  return counted !== undefined && equivalents
    ? { meant: counted, meantBy: "equivalents", by: equivalents, backed: false }
    : undefined;
}

/** What would have to be weighed or measured out for the amount meant, as the writer measures it. */
export function neededText({ by, meant, holds, massG }: Weighing): string {
  const times = meant / holds;
  return by.of === "volume" ? volumeText(by.base * times) : massText(massG * times);
}

/** Whether two figures are one statement, within what the writer's digits allow. */
export function agrees(a: number, b: number, rounding: number, tolerance = TOLERANCE): boolean {
  return Math.abs(a / b - 1) <= tolerance + rounding;
}

/** The writer counts molecules of a dimer or trimer, not of what they give. */
export function countedWhole(context: AdviceContext, weighing: Weighing, { form, compound }: ResolvedCharge): boolean {
  const forms = form ? [form] : (context.lexicon?.formsOf(compound.id) ?? []);
  const { massG, meant, rounding } = weighing;
  return forms.some(
    ({ kind, massPerMole }) =>
      kind === "oligomer" &&
      [2, 3].some((units) => agrees(massG / massPerMole / units, meant, rounding, ASSAY_TOLERANCE)),
  );
}

/**
 * The weighed mass fits the compound itself, although another form of it was weighed.
 *
 * @returns g per mol that the writer reckoned with, or undefined
 */
export function weighedAs(context: AdviceContext, weighing: Weighing, charge: ResolvedCharge): number | undefined {
  const { form, compound } = charge;
  if (!form || form.kind === "neat") return undefined;
  if (agrees(weighing.holds, weighing.meant, weighing.rounding, ASSAY_TOLERANCE)) return undefined;
  if (countedWhole(context, weighing, charge)) return undefined;
  const reckoned = [compound.molarMass, form.massPerMole];
  return reckoned.find((grams) => agrees(weighing.massG / grams, weighing.meant, weighing.rounding, 0.03));
}
