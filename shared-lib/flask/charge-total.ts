/** From what was weighed or measured out to mol of the compound, after assay, density and supplied form. */

import type { Compound, SuppliedForm } from "../compounds/types.ts";
import type { Interval } from "../model/contract.ts";
import type { Quantity } from "../notes/types.ts";
import type { WrittenQuantities } from "./charge-quantities.ts";

export interface TotalOfCharge {
  /** mol */
  readonly total?: Interval;
  /** g and L of what is weighed out. */
  readonly massG?: number;
  readonly volumeL?: number;
  readonly how: readonly string[];
}

/** What one gram of the weighed material holds. */
export interface Material {
  /** g that hold 1 mol of the compound. */
  readonly gramsPerMole: Interval;
  /** g/mL; undefined when neither the note nor the tables give it. */
  readonly density?: number;
  /** g that hold 1 mol with the assay left out, as writers of solids reckon; not for solutions or a written assay. */
  readonly nominalGramsPerMole?: number;
  /** mol/L; undefined when neither written nor the way the form is sold. */
  readonly molarity?: Interval;
}

const exactly = (value: number): Interval => ({ value, low: value, high: value });

/** Density of a table against the lot in hand: 2 % (common practice, no source). */
const DENSITY_SPREAD = 0.02;
/** "ca. 5 g": within a tenth (common practice, no source). */
const ABOUT_SPREAD = 0.1;
/** Amount and mass that agree this well are one statement with rounding in it. */
const AGREEING = 0.05;

/** Material of a charge: the written assay, density and molarity win over those of the supplied form. */
export function materialOf(compound: Compound, form: SuppliedForm | undefined, written: WrittenQuantities): Material {
  const perMole = form?.massPerMole ?? compound.molarMass;
  const assay = written.assay ? exactly(written.assay.base) : (form?.assay ?? exactly(1));
  const isNeat = !form || form.kind === "neat";
  const density = written.density?.base ?? form?.density ?? (isNeat ? compound.density : undefined);
  const molarity = written.concentration ? exactly(written.concentration.base) : form?.molarity;
  const gramsPerMole = { value: perMole / assay.value, low: perMole / assay.high, high: perMole / assay.low };
  const nominal = form && form.kind !== "solution" && !written.assay ? { nominalGramsPerMole: perMole } : {};
  return { gramsPerMole, ...nominal, ...(density ? { density } : {}), ...(molarity ? { molarity } : {}) };
}

function asWritten(quantity: Quantity): Interval {
  const { base, range } = quantity;
  if (range && range.low > 0 && range.high >= range.low) return { value: base, low: range.low, high: range.high };
  const spread = quantity.approximate ? ABOUT_SPREAD : 0;
  return { value: base, low: base * (1 - spread), high: base * (1 + spread) };
}

/** mol from the mass, else from volume and molarity, else from volume and density. */
function fromWeighing(written: WrittenQuantities, material: Material): TotalOfCharge | undefined {
  const { gramsPerMole, density, molarity } = material;
  if (written.mass) {
    const mass = asWritten(written.mass);
    const total = {
      value: mass.value / gramsPerMole.value,
      low: mass.low / gramsPerMole.high,
      high: mass.high / gramsPerMole.low,
    };
    return { total, massG: mass.value, how: [`${written.mass.text} at ${figure(gramsPerMole.value)} g per mol of it`] };
  }
  if (!written.volume) return undefined;
  const volume = asWritten(written.volume);
  const volumeL = volume.value;
  if (molarity) {
    const total = {
      value: volume.value * molarity.value,
      low: volume.low * molarity.low,
      high: volume.high * molarity.high,
    };
    const massG = density ? { massG: volumeL * 1000 * density } : {};
    return { total, volumeL, ...massG, how: [`${written.volume.text} of ${figure(molarity.value)} M`] };
  }
  if (!density) return { volumeL, how: [`${written.volume.text}; no density is known, so no amount follows`] };
  const massG = volumeL * 1000 * density;
  const spread = written.density ? 0 : DENSITY_SPREAD;
  const total = {
    value: massG / gramsPerMole.value,
    low: (volume.low * 1000 * density * (1 - spread)) / gramsPerMole.high,
    high: (volume.high * 1000 * density * (1 + spread)) / gramsPerMole.low,
  };
  const how = `${written.volume.text} at ${figure(density)} g/mL and ${figure(gramsPerMole.value)} g per mol of it`;
  return { total, volumeL, massG, how: [how] };
}

/** Four digits that a person can read. */
function figure(value: number): string {
  return String(Number(value.toPrecision(4)));
}

function fits(mol: number, amount: Interval): boolean {
  return Math.abs(mol / amount.value - 1) <= AGREEING;
}

/** Written amount beside a weighing: agreeing, the amount stands; else the weighing, with bounds over both. */
function reconcile(
  weighed: TotalOfCharge,
  amount: Interval,
  assumedForm: boolean,
  nominalGrams: number | undefined,
): TotalOfCharge {
  if (!weighed.total) return { ...weighed, total: amount, how: [...weighed.how, "the amount is as written"] };
  const low = Math.min(weighed.total.low, amount.low);
  const high = Math.max(weighed.total.high, amount.high);
  if (fits(weighed.total.value, amount))
    return { ...weighed, total: { value: amount.value, low, high }, how: [...weighed.how, "as written"] };
  const nominal =
    nominalGrams !== undefined && weighed.massG !== undefined && fits(weighed.massG / nominalGrams, amount);
  const value = assumedForm || nominal ? amount.value : weighed.total.value;
  const says = nominal
    ? "the written amount leaves out the usual assay"
    : assumedForm
      ? "the written amount is taken: the form is only assumed"
      : "the weighing is taken: the written amount does not agree";
  return { ...weighed, total: { value, low, high }, how: [...weighed.how, says] };
}

/**
 * mol of a charge, and the mass and volume that go with it.
 *
 * @param written usable quantities of the charge
 * @param equivalent mol that one equivalent stands for in this step, when known
 * @returns no total when it does not follow from what is written
 */
export function totalOfCharge(
  written: WrittenQuantities,
  material: Material,
  assumedForm: boolean,
  equivalent?: number,
): TotalOfCharge {
  const weighed = fromWeighing(written, material);
  const amount = written.amount ? asWritten(written.amount) : undefined;
  if (weighed && (weighed.total || amount))
    return filled(amount ? reconcile(weighed, amount, assumedForm, material.nominalGramsPerMole) : weighed, material);
  if (amount) return filled({ total: amount, how: [`${written.amount?.text ?? ""} as written`] }, material);
  if (written.equivalents && equivalent) {
    const equivalents = asWritten(written.equivalents);
    const total = {
      value: equivalents.value * equivalent,
      low: equivalents.low * equivalent,
      high: equivalents.high * equivalent,
    };
    return filled(
      { total, how: [`${written.equivalents.text} of ${figure(equivalent * 1000)} mmol`, ...(weighed?.how ?? [])] },
      material,
    );
  }
  return weighed ?? { how: [] };
}

/** Adds the mass and the volume that follow from the total. */
function filled(result: TotalOfCharge, material: Material): TotalOfCharge {
  if (!result.total) return result;
  const massG = result.massG ?? result.total.value * material.gramsPerMole.value;
  const volumeL = result.volumeL ?? (material.density ? massG / material.density / 1000 : undefined);
  return { ...result, massG, ...(volumeL === undefined ? {} : { volumeL }) };
}
