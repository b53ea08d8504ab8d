/** One vessel while the note is followed: what is in it, how warm, how acid. */

import type { Contents } from "../equilibrium/types.ts";
import { mixtureBoilingPoint } from "../media/boiling.ts";
import { bufferByKey, bufferPH } from "../media/buffers.ts";
import { compositionOf } from "../media/composition.ts";
import { molesInVolume, solventByKey } from "../media/solvents.ts";
import type { MediumPart, MediumPhrase } from "../notes/types.ts";
import { pHFromCharges } from "./ph-from-charges.ts";
import { phraseAmounts, type SolventAmount, solventOfPart } from "./phrase-amounts.ts";
import { countsAsSolvent } from "./resolve-charges.ts";
import type { SaidOfStep } from "./said-by-directive.ts";
import type { ResolvedCharge } from "./types.ts";

/** Where a note gives no volume, its largest carbonyl is taken to be 0.2 M (common practice, no source). */
const USUAL_MOLARITY = 0.2;
const USUAL_VOLUME_L = 0.01;

export interface Vessel {
  readonly charges: readonly ResolvedCharge[];
  readonly solvents: readonly SolventAmount[];
  /** Mixtures whose size is not written. */
  readonly unsized: readonly (readonly MediumPart[])[];
  readonly buffer?: { readonly buffer: string; readonly molarity?: number };
  readonly temperatureK: number;
  readonly temperatureStated: boolean;
  readonly pH?: number;
  /** pH that a buffer was written with; it moves with temperature. */
  readonly bufferPH?: number;
  readonly pHStated: boolean;
}

export function emptyVessel(temperatureK: number): Vessel {
  return { charges: [], solvents: [], unsized: [], temperatureK, temperatureStated: false, pHStated: false };
}

export function withCharge(vessel: Vessel, charge: ResolvedCharge): Vessel {
  const itself =
    countsAsSolvent(charge.compound) && charge.compound.solvent && charge.total
      ? [{ solvent: charge.compound.solvent, amount: charge.total.value }]
      : [];
  return {
    ...vessel,
    charges: [...vessel.charges, charge],
    solvents: [...vessel.solvents, ...charge.brings, ...itself],
  };
}

export function withMedium(vessel: Vessel, phrase: MediumPhrase): Vessel {
  const sized = phraseAmounts(phrase.parts, phrase.volumeL);
  const known = phrase.parts.filter((part) => solventOfPart(part));
  const bufferPart = phrase.parts.find((part) => part.solvent !== undefined && bufferByKey(part.solvent));
  const buffer = bufferPart?.solvent;
  const molarity = bufferPart?.molarity;
  const fresh = known.some((part) => !alreadyIn(vessel, solventOfPart(part)?.key));
  const unsized = sized.length === 0 && fresh ? [...vessel.unsized, known] : vessel.unsized;
  const warmed = phrase.temperatureK === undefined ? vessel : withTemperature(vessel, phrase.temperatureK);
  return {
    ...warmed,
    solvents: [...vessel.solvents, ...sized],
    unsized,
    ...(buffer ? { buffer: { buffer, ...(molarity === undefined ? {} : { molarity }) } } : {}),
    ...(phrase.pH === undefined
      ? {}
      : buffer
        ? { bufferPH: phrase.pH, pHStated: true }
        : { pH: phrase.pH, pHStated: true }),
  };
}

/** "In water" after water has been measured in adds nothing: the words speak of the same water. */
function alreadyIn(vessel: Vessel, key: string | undefined): boolean {
  const named = vessel.unsized.some((parts) => parts.some((part) => solventOfPart(part)?.key === key));
  return named || vessel.solvents.some((row) => row.solvent === key);
}

/** More than this in one vessel is no flask: what follows is left out, so that the time stays in bounds. */
const MOST_CHARGES = 48;
const MOST_SOLVENTS = 200;

export function isFull({ charges, solvents, unsized }: Vessel): boolean {
  return charges.length >= MOST_CHARGES || solvents.length + unsized.length >= MOST_SOLVENTS;
}

/** The vessel as the writer's directives have it; a medium takes the volume of what was read, or a usual one. */
export function asSaid(vessel: Vessel, said: SaidOfStep | undefined): Vessel {
  if (!said) return vessel;
  const { temperatureK, pH, medium } = said;
  const read = litresOf(allSolventsOf(vessel));
  const litres = read > 0 ? read : USUAL_VOLUME_L;
  const whole = medium ? litresOf(medium) : 0;
  const solvents = medium?.map((row) => ({ solvent: row.solvent, amount: (row.amount * litres) / whole }));
  return {
    ...vessel,
    ...(temperatureK === undefined ? {} : { temperatureK, temperatureStated: true }),
    ...(pH === undefined ? {} : { pH, pHStated: true }),
    ...(solvents && whole > 0 ? { solvents, unsized: [] } : {}),
  };
}

export function withTemperature(vessel: Vessel, temperatureK: number): Vessel {
  return { ...vessel, temperatureK, temperatureStated: true };
}

/** All solvents gone, or the water alone. */
export function without(vessel: Vessel, what: "solvent" | "water"): Vessel {
  if (what === "solvent") return { ...vessel, solvents: [], unsized: [] };
  return { ...vessel, solvents: vessel.solvents.filter((row) => row.solvent !== "water") };
}

export function poured(from: Vessel, into: Vessel): Vessel {
  const pH = into.pH ?? from.pH;
  const buffer = into.buffer ?? from.buffer;
  return {
    ...into,
    charges: [...into.charges, ...from.charges],
    solvents: [...into.solvents, ...from.solvents],
    unsized: [...into.unsized, ...from.unsized],
    ...(buffer ? { buffer } : {}),
    ...((into.bufferPH ?? from.bufferPH) === undefined ? {} : { bufferPH: into.bufferPH ?? from.bufferPH }),
    ...(pH === undefined ? {} : { pH }),
    pHStated: into.pHStated || from.pHStated,
  };
}

/** Boiling point of the mixture at 1 atm, K. */
export function refluxTemperature(vessel: Vessel): number | undefined {
  return mixtureBoilingPoint(compositionOf(allSolventsOf(vessel), 298.15));
}

function litresOf(rows: readonly SolventAmount[]): number {
  return rows.reduce((sum, row) => {
    const solvent = solventByKey(row.solvent);
    return solvent ? sum + row.amount / molesInVolume(solvent, 1) : sum;
  }, 0);
}

/** Sized solvents, and the unsized mixtures at a usual size. */
function allSolventsOf(vessel: Vessel): readonly SolventAmount[] {
  if (vessel.unsized.length === 0) return merged(vessel.solvents);
  const largest = Math.max(
    0,
    ...vessel.charges.map((charge) => (charge.compound.carbonyl && charge.total?.value) || 0),
  );
  const usual = largest > 0 ? largest / USUAL_MOLARITY : USUAL_VOLUME_L;
  const each = Math.max(usual, litresOf(vessel.solvents)) / vessel.unsized.length;
  return merged([...vessel.solvents, ...vessel.unsized.flatMap((parts) => phraseAmounts(parts, each))]);
}

function merged(rows: readonly SolventAmount[]): readonly SolventAmount[] {
  const sums = new Map<string, number>();
  for (const { solvent, amount } of rows) {
    if (amount > 0 && Number.isFinite(amount)) sums.set(solvent, (sums.get(solvent) ?? 0) + amount);
  }
  return [...sums].map(([solvent, amount]) => ({ solvent, amount }));
}

/** The vessel as the equilibrium stage takes it, and the mention of each carbonyl row. */
export function contentsOf(vessel: Vessel): {
  readonly contents: Contents;
  readonly carbonylMentions: readonly number[];
  readonly volumeStated: boolean;
} {
  const carbonyls = vessel.charges.filter((charge) => charge.compound.carbonyl);
  const solutes = vessel.charges.filter((charge) => !charge.compound.carbonyl && !countsAsSolvent(charge.compound));
  const solvents = allSolventsOf(vessel);
  const row = vessel.buffer ? bufferByKey(vessel.buffer.buffer) : undefined;
  const pH =
    vessel.pH ??
    (row ? bufferPH(row, vessel.temperatureK, vessel.bufferPH) : undefined) ??
    pHFromCharges(vessel.charges, solvents);
  const contents: Contents = {
    temperatureK: vessel.temperatureK,
    ...(pH === undefined ? {} : { pH }),
    solvents,
    carbonyls: carbonyls.map(({ compound, total }) => ({ compound, amount: total?.value ?? 0 })),
    solutes: solutes.map(({ compound, total }) => ({ compound, amount: total?.value ?? 0 })),
    ...(vessel.buffer ? { buffer: vessel.buffer } : {}),
  };
  return {
    contents,
    carbonylMentions: carbonyls.map((charge) => charge.mention),
    volumeStated: vessel.unsized.length === 0,
  };
}
