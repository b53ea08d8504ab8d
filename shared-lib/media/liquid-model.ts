/** A mixture of solvents made ready for many activity calculations at one temperature: its UNIFAC tables, and where it needs mending. */

import { type Solvent, solventByKey } from "./solvents.ts";
import { hasGroups, lnGammas, prepareUnifac, type UnifacMixture } from "./unifac.ts";

export interface LiquidModel {
  readonly solvents: readonly Solvent[];
  readonly unifac: UnifacMixture;
  /** Index of water, −1 without. */
  readonly water: number;
  /** What ln γ of water gains in each solvent, dry, so that a = x/x_sat there; undefined where nothing is to mend. */
  readonly wetting?: readonly number[];
  /** Two of the components split: an activity may rise, fall and rise again as its share grows. */
  readonly gap: boolean;
}

/** Where a gap is looked for: closer together near the pure liquids, where the limits of sparing solubility lie. */
export const GRID: readonly number[] = [
  0.0005,
  0.002,
  ...Array.from({ length: 15 }, (_, k) => ((k + 1) / 16) ** 2 * (3 - (2 * (k + 1)) / 16)),
  0.998,
  0.9995,
  0.9999,
];

const KEPT = 48;
const cache = new Map<string, LiquidModel>();

/** ln γ of water, infinitely dilute in a solvent at 25 °C, by the model. */
function lnGammaOfTrace(key: string): number {
  return lnGammas(prepareUnifac(["water", key], 298.15), [1e-9, 1 - 1e-9])[0] ?? 0;
}

const wettingOf = new Map<string, number>();

/** ln(1/x_sat) − ln γ∞ of the model, for a solvent that takes up little water: alkanes, arenes and ethers are up to 2.5 off without. */
function wetting(solvent: Solvent): number {
  if (solvent.waterSaturation === undefined) return 0;
  let value = wettingOf.get(solvent.key);
  if (value === undefined) {
    value = -Math.log(solvent.waterSaturation) - lnGammaOfTrace(solvent.key);
    wettingOf.set(solvent.key, value);
  }
  return value;
}

/** Whether the activity of component `i` ever falls while its share beside component `j` rises, by the tables of the whole mixture. */
function hasGap(unifac: UnifacMixture, i: number, j: number): boolean {
  const x = new Float64Array(unifac.size);
  let last = 0;
  for (const share of GRID) {
    x[i] = share;
    x[j] = 1 - share;
    const activity = share * Math.exp(lnGammas(unifac, x)[i] as number);
    if (activity < last) return true;
    last = activity;
  }
  return false;
}

/** Whether any two of the solvents split, by the table of solubilities or by the model. */
function anyGap(solvents: readonly Solvent[], unifac: UnifacMixture): boolean {
  return solvents.some((first, i) =>
    solvents.some(
      (second, j) =>
        i !== j && ((first.nucleophile === "water" && second.waterSaturation !== undefined) || hasGap(unifac, i, j)),
    ),
  );
}

function build(keys: readonly string[], temperatureK: number): LiquidModel {
  const solvents = keys.map((key) => solventByKey(key) as Solvent);
  const unifac = prepareUnifac(keys, temperatureK);
  const mends = solvents.map(wetting);
  return {
    solvents,
    unifac,
    water: solvents.findIndex((solvent) => solvent.nucleophile === "water"),
    ...(mends.some((mend) => mend !== 0) ? { wetting: mends } : {}),
    gap: anyGap(solvents, unifac),
  };
}

/** The model of a mixture of solvents that all have groups; the last few dozen are kept. */
export function liquidModel(keys: readonly string[], temperatureK: number): LiquidModel {
  const name = `${keys.join("|")}@${temperatureK}`;
  let model = cache.get(name);
  if (!model) {
    if (cache.size >= KEPT) cache.delete(cache.keys().next().value as string);
    model = build(keys, temperatureK);
    cache.set(name, model);
  }
  return model;
}

/** True when the model can be built with this solvent. */
export function isModelled(solvent: Solvent): boolean {
  return hasGroups(solvent.key);
}

/**
 * ln γ of every component.
 *
 * @param x mole fractions, adding up to 1
 * @param phi volume fractions, for the mend of wet solvents
 */
export function lnGammasOf(model: LiquidModel, x: ArrayLike<number>, phi: ArrayLike<number>): Float64Array {
  const result = lnGammas(model.unifac, x);
  if (model.wetting && model.water >= 0) {
    let mend = 0;
    for (let j = 0; j < model.wetting.length; j++) mend += (phi[j] as number) * (model.wetting[j] as number);
    result[model.water] = (result[model.water] as number) + mend;
  }
  return result;
}
