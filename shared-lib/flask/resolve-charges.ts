/** Every charge of a note in real amounts. */

import type { Lexicon } from "../compounds/lexicon.ts";
import type { Compound } from "../compounds/types.ts";
import type { Interval } from "../model/contract.ts";
import type { Charge, NoteReading } from "../notes/types.ts";
import { carriedSolvents } from "./carried-solvents.ts";
import { writtenCount, writtenQuantities } from "./charge-quantities.ts";
import { materialOf, totalOfCharge } from "./charge-total.ts";
import { equivalentOfStep, type WrittenCount } from "./equivalent-of-step.ts";
import type { ResolvedCharge } from "./types.ts";
import { weighedForm } from "./weighed-form.ts";

/**
 * Charges with a known structure, in the order of writing. Charges written only in equivalents are resolved against the
 * others of their step.
 */
export function resolveCharges(reading: NoteReading, lexicon?: Lexicon): readonly ResolvedCharge[] {
  const first = reading.charges.flatMap((charge, index) => resolve(reading, charge, index, undefined, lexicon) ?? []);
  const written = new Map<number, WrittenCount>();
  reading.charges.forEach((charge, index) => {
    const count = writtenCount(charge);
    if (count) written.set(index, count);
  });
  const bySteps = new Map<number, ResolvedCharge[]>();
  for (const charge of first) {
    const step = bySteps.get(charge.step);
    if (step) step.push(charge);
    else bySteps.set(charge.step, [charge]);
  }
  const resolved = [...bySteps.values()].flatMap((charges) => {
    const one = equivalentOfStep(charges, written);
    if (!one) return charges;
    return charges.map((charge) => {
      const source = reading.charges[charge.charge];
      const again =
        charge.total || one.by !== "written" || !source
          ? charge
          : resolve(reading, source, charge.charge, one.mol, lexicon);
      const known = again ?? charge;
      const equivalents =
        written.get(charge.charge)?.equivalents ?? (known.total ? known.total.value / one.mol : undefined);
      return equivalents === undefined ? known : { ...known, equivalents };
    });
  });
  return resolved.toSorted((a, b) => a.charge - b.charge);
}

function resolve(
  reading: NoteReading,
  charge: Charge,
  index: number,
  equivalent: number | undefined,
  lexicon: Lexicon | undefined,
): ResolvedCharge | undefined {
  const mention = reading.mentions[charge.mention];
  const compound = mention?.compound;
  if (!mention || !compound || mention.role === "product") return undefined;
  const { form, formIs } = weighedForm(mention, charge, compound, lexicon);
  const written = writtenQuantities(charge);
  const material = materialOf(compound, form, written);
  const whole = totalOfCharge(written, material, formIs === "assumed", equivalent);
  const share = charge.share !== undefined && charge.share > 0 && charge.share < 1 ? charge.share : 1;
  const total = whole.total ? scaled(whole.total, share) : undefined;
  const massG = whole.massG === undefined ? undefined : whole.massG * share;
  const volumeL = whole.volumeL === undefined ? undefined : whole.volumeL * share;
  const brings = carriedSolvents({
    compound,
    ...(form ? { form } : {}),
    ...(charge.dissolvedIn ? { dissolvedIn: charge.dissolvedIn } : {}),
    ...(written.assay ? { assay: written.assay.base } : {}),
    ...(total ? { totalMol: total.value } : {}),
    ...(massG === undefined ? {} : { massG }),
    ...(volumeL === undefined ? {} : { volumeL }),
  });
  return {
    charge: index,
    mention: charge.mention,
    step: charge.step,
    compound,
    ...(form ? { form } : {}),
    formIs,
    ...(total ? { total } : {}),
    ...(massG === undefined ? {} : { massG }),
    ...(volumeL === undefined ? {} : { volumeL }),
    brings,
    how: whole.how,
  };
}

function scaled(total: Interval, share: number): Interval {
  return { value: total.value * share, low: total.low * share, high: total.high * share };
}

/** The compound stands among the solvents of a flask when it is one and brings no group that has to be followed. */
export function countsAsSolvent(compound: Compound): boolean {
  if (!compound.solvent || compound.carbonyl) return false;
  return !compound.tags.some((tag) => tag === "primary amine" || tag === "secondary amine" || tag === "ammonia");
}
