/** Activities of the solvents of a mixture (pure liquid = 1): between 0 and 1, and never falling while a nucleophile's share rises. */

import type { Component, Composition } from "./composition.ts";
import { GRID, isModelled, type LiquidModel, liquidModel, lnGammasOf } from "./liquid-model.ts";

export interface Activities {
  /** By key of the solvents table. */
  readonly activity: Readonly<Record<string, number>>;
  /** Standard deviation of ln a of water and the alcohols. */
  readonly sd: number;
  /** The model sees two liquid phases, and one of the solvents does not mix with water in all proportions. */
  readonly twoPhases: boolean;
  readonly flags: readonly string[];
}

/** The parameters were fitted from about 0 °C; the ends are what the pages promise. */
const COLDEST_K = 253.15;
const HOTTEST_K = 373.15;
interface Shares {
  /** Mole fraction of all modelled components together: what is left is taken as an ideal diluent. */
  readonly total: number;
  readonly x: Float64Array;
  readonly phi: Float64Array;
}

/** Shares of the modelled components alone, adding up to 1. */
function sharesOf(components: readonly Component[]): Shares {
  let moles = 0;
  let volume = 0;
  for (const component of components) {
    moles += component.moleFraction;
    volume += component.volumeFraction;
  }
  const x = new Float64Array(components.length);
  const phi = new Float64Array(components.length);
  components.forEach((component, i) => {
    x[i] = component.moleFraction / moles;
    phi[i] = component.volumeFraction / volume;
  });
  return { total: moles, x, phi };
}

/** Activity of component `i` when its mole fraction is `u` and the others keep their proportions. */
function alongRay(model: LiquidModel, shares: Shares, i: number, u: number): number {
  const x = new Float64Array(shares.x.length);
  const rest = (1 - u) / (1 - (shares.x[i] as number));
  for (let j = 0; j < x.length; j++) x[j] = j === i ? u : (shares.x[j] as number) * rest;
  if (!model.wetting) return u * Math.exp(lnGammasOf(model, x, shares.phi)[i] as number);
  const phi = new Float64Array(x.length);
  let volume = 0;
  for (let j = 0; j < x.length; j++) {
    const own = shares.x[j] as number;
    phi[j] = own > 0 ? ((shares.phi[j] as number) / own) * (x[j] as number) : 0;
    volume += phi[j] as number;
  }
  for (let j = 0; j < phi.length; j++) phi[j] = (phi[j] as number) / volume;
  return u * Math.exp(lnGammasOf(model, x, phi)[i] as number);
}

const GOLDEN = (Math.sqrt(5) - 1) / 2;
const GOLDEN_STEPS = 10;

/** Extreme of an activity between two mole fractions, by golden section: `sign` 1 for the highest, −1 for the lowest. */
function extremeBetween(
  model: LiquidModel,
  shares: Shares,
  i: number,
  ends: readonly [number, number],
  sign: 1 | -1,
): number {
  const height = (u: number): number => sign * alongRay(model, shares, i, u);
  let [low, high] = ends;
  let first = high - GOLDEN * (high - low);
  let second = low + GOLDEN * (high - low);
  let a = height(first);
  let b = height(second);
  for (let step = 0; step < GOLDEN_STEPS; step++) {
    if (a < b) {
      low = first;
      first = second;
      a = b;
      second = low + GOLDEN * (high - low);
      b = height(second);
    } else {
      high = second;
      second = first;
      b = a;
      first = high - GOLDEN * (high - low);
      a = height(first);
    }
  }
  return sign * Math.max(a, b);
}

/**
 * A model that sees a miscibility gap gives an activity that rises, falls and rises again. Its place is taken by the mean of the highest
 * value on the way from none of the component to what there is and the lowest on the way from there to the pure component, which never
 * falls and lies near the level that the two phases would share.
 */
function levelled(model: LiquidModel, shares: Shares, i: number, here: number): number {
  const x = shares.x[i] as number;
  let highest = here;
  let highestAt = -1;
  let lowest = here;
  let lowestAt = -1;
  GRID.forEach((u, k) => {
    const value = alongRay(model, shares, i, u);
    if (u < x && value > highest) {
      highest = value;
      highestAt = k;
    } else if (u > x && value < lowest) {
      lowest = value;
      lowestAt = k;
    }
  });
  if (highestAt >= 0 && highest < 1) {
    const ends = [GRID[highestAt - 1] ?? 1e-9, Math.min(x, GRID[highestAt + 1] ?? x)] as const;
    highest = Math.max(highest, extremeBetween(model, shares, i, ends, 1));
  }
  if (lowestAt >= 0 && lowest < 1) {
    const ends = [Math.max(x, GRID[lowestAt - 1] ?? x), GRID[lowestAt + 1] ?? 1 - 1e-9] as const;
    lowest = Math.min(lowest, extremeBetween(model, shares, i, ends, -1));
  }
  return (Math.min(1, highest) + Math.min(1, lowest)) / 2;
}

function errorOf(composition: Composition, temperatureK: number): number {
  let other = 0;
  let sd = 0;
  for (const { solvent, volumeFraction } of composition.components) {
    if (solvent.nucleophile === "water") continue;
    other += volumeFraction;
    sd += volumeFraction * solvent.sdLnWaterActivity;
  }
  if (other === 0) return 0;
  const cold = temperatureK < 273.15 ? (0.05 * (273.15 - temperatureK)) / 10 : 0;
  return Math.hypot(sd / other, cold) * Math.min(1, 2 * other);
}

/** Name of a solvent that splits from water at this temperature, when there is enough of both. */
function splittingAt(composition: Composition, temperatureK: number): string | undefined {
  const enough = 0.1;
  const celsius = temperatureK - 273.15;
  const water = composition.components.find(({ solvent }) => solvent.nucleophile === "water");
  if (!water || water.volumeFraction < enough) return undefined;
  return composition.components.find(
    ({ solvent, volumeFraction }) =>
      volumeFraction >= enough && solvent.splits && celsius > solvent.splits[0] && celsius < solvent.splits[1],
  )?.solvent.name;
}

function compute(composition: Composition, temperatureK: number): Activities {
  const { components } = composition;
  const activity: Record<string, number> = {};
  const flags: string[] = [];
  let twoPhases = false;
  for (const component of components) activity[component.solvent.key] = component.moleFraction;
  const modelled = components.filter((component) => isModelled(component.solvent));
  if (modelled.length > 1) {
    const model = liquidModel(
      modelled.map((component) => component.solvent.key),
      Math.max(COLDEST_K, Math.min(HOTTEST_K, temperatureK)),
    );
    const shares = sharesOf(modelled);
    const lnGamma = lnGammasOf(model, shares.x, shares.phi);
    const partly = modelled.some((component) => !component.solvent.miscible && component.moleFraction > 0);
    modelled.forEach((component, i) => {
      const raw = (shares.x[i] as number) * Math.exp(lnGamma[i] as number);
      const held = model.gap && component.solvent.nucleophile !== "none" ? levelled(model, shares, i, raw) : raw;
      activity[component.solvent.key] = Math.min(1, shares.total * Math.min(1, held));
      if (raw > 1 && partly) twoPhases = true;
      else if (raw > 1 || Math.abs(held - raw) > 0.005)
        flags.push(`${component.solvent.name} is near a miscibility limit of this mixture`);
    });
    if (twoPhases) flags.push("these solvents form two liquid phases");
    if (model.unifac.predicted) flags.push("some group parameters are predicted, not published");
  }
  const splitting = splittingAt(composition, temperatureK);
  if (splitting && !twoPhases) {
    twoPhases = true;
    flags.push(`${splitting} and water form two liquid phases at this temperature`);
  }
  const ideal = components.filter((component) => !isModelled(component.solvent));
  if (ideal.length > 0 && components.length > 1)
    flags.push(`no activity model for ${ideal.map((component) => component.solvent.name).join(", ")}: taken as ideal`);
  return { activity, sd: errorOf(composition, temperatureK), twoPhases, flags };
}

/** The last answer: every site and every nucleophile of a flask asks for the same composition in turn. */
let last:
  | { readonly composition: Composition; readonly temperatureK: number; readonly activities: Activities }
  | undefined;

/**
 * Activities of a composition at a temperature (used from −20 to 100 °C; beyond, the value at the end of that range).
 * A solvent without groups counts as ideal, and that is flagged. A value above 1, or one that falls while its share rises, means that the
 * model sees two phases: it is levelled, held at 1, and flagged.
 */
export function activitiesOf(composition: Composition, temperatureK: number): Activities {
  if (last?.composition === composition && last.temperatureK === temperatureK) return last.activities;
  const activities = compute(composition, temperatureK);
  last = { composition, temperatureK, activities };
  return activities;
}
