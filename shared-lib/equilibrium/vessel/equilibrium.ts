/**
 * The vessel at equilibrium: all species of all carbonyls under one mass balance, with the medium's corrections following what is left
 * free. Volume is that of the solvents and carbonyls, unchanged by binding.
 */

import type { Composition } from "../../media/composition.ts";
import { type BalanceSolution, type BalanceSystem, solveBalance } from "../balance/solve-balance.ts";
import type { MediumCorrection, Species } from "../forms/species.ts";
import type { Vessel } from "./ligands.ts";
import { type Correction, correctionOf, freeComposition } from "./medium-corrections.ts";

/** One molecule (or site) that shares out its total over its species. */
export interface VesselSet {
  readonly species: readonly Species[];
  /** mol of molecules, above 0. */
  readonly total: number;
}

export interface VesselEquilibrium {
  readonly system: BalanceSystem;
  readonly solution: BalanceSolution;
  /** Species of set i stand from `offsets[i]` on in the system; those of the free ligands follow after the last. */
  readonly offsets: readonly number[];
  readonly corrections: ReadonlyMap<MediumCorrection, Correction>;
  /** Of the solvents that are left free. */
  readonly composition: Composition;
  /** Passes over the medium's corrections. */
  readonly passes: number;
  readonly settled: boolean;
}

export const MOST_PASSES = 40;
const SETTLED = 1e-11;
/** Carbonyl over the least ligand below which binding cannot change the medium. */
const TRACE = 1e-9;

interface Skeleton {
  readonly system: BalanceSystem;
  readonly baseLn: Float64Array;
  readonly species: readonly Species[];
  readonly offsets: number[];
  readonly names: readonly MediumCorrection[];
}

function skeletonOf(sets: readonly VesselSet[], vessel: Vessel): Skeleton {
  const { ligands, volumeL } = vessel;
  const components = sets.length + ligands.length;
  const ligandIndex = new Map(ligands.map((ligand, i) => [ligand.name, sets.length + i]));
  const all: Species[] = [];
  const offsets: number[] = [];
  const owners: number[] = [];
  sets.forEach((set, i) => {
    offsets.push(all.length);
    for (const one of set.species) {
      // A ligand that is not there cannot be held.
      if (one.holds.some(({ ligand }) => !ligandIndex.has(ligand))) continue;
      all.push(one);
      owners.push(i);
    }
  });
  offsets.push(all.length);
  const count = all.length + ligands.length;
  const first = new Int32Array(count + 1);
  const part: number[] = [];
  const nu: number[] = [];
  const baseLn = new Float64Array(count);
  const lnVolume = Math.log(volumeL);
  all.forEach((one, s) => {
    part.push(owners[s] as number);
    nu.push(one.units);
    for (const { ligand, count: held } of one.holds) {
      part.push(ligandIndex.get(ligand) as number);
      nu.push(held);
    }
    first[s + 1] = part.length;
    baseLn[s] = one.ln + lnVolume;
  });
  ligands.forEach((ligand, i) => {
    part.push(sets.length + i);
    nu.push(1);
    first[all.length + i + 1] = part.length;
    baseLn[all.length + i] = Math.log(ligand.unit) + lnVolume;
  });
  const totals = Float64Array.from([...sets, ...ligands], ({ total }) => total);
  const names = [...new Set(all.flatMap((one) => one.corrections.map(({ name }) => name)))];
  const stoichiometry = { first, part: Int32Array.from(part), nu: Float64Array.from(nu) };
  return {
    system: { components, ...stoichiometry, lnA: new Float64Array(count), totals },
    baseLn,
    species: all,
    offsets,
    names,
  };
}

function applyCorrections(skeleton: Skeleton, corrections: ReadonlyMap<MediumCorrection, Correction>): void {
  const { system, baseLn, species } = skeleton;
  system.lnA.set(baseLn);
  species.forEach((one, s) => {
    for (const { name, count } of one.corrections)
      system.lnA[s] = (system.lnA[s] as number) + count * (corrections.get(name)?.ln ?? 0);
  });
}

/** Everything free: the guess that dilute carbonyls hardly change. */
function startOf(sets: readonly VesselSet[], vessel: Vessel): Float64Array {
  return Float64Array.from([...sets, ...vessel.ligands], (one) =>
    Math.log(one.total / vessel.volumeL / ("unit" in one ? one.unit : 1)),
  );
}

/**
 * Solves a vessel. Ends after `MOST_PASSES` passes of the medium's corrections at the latest, each with a bounded solver.
 *
 * @param saltActivity activity of water over the dissolved salts alone
 */
export function equilibrate(
  sets: readonly VesselSet[],
  vessel: Vessel,
  temperatureK: number,
  saltActivity: number,
): VesselEquilibrium & { readonly species: readonly Species[] } {
  const skeleton = skeletonOf(sets, vessel);
  const { system, species, names } = skeleton;
  const waterAt = sets.length + vessel.ligands.findIndex((ligand) => ligand.name === "water");
  const carbonyls = sets.reduce((sum, set) => sum + set.total, 0);
  const least = Math.min(...vessel.ligands.map((ligand) => ligand.total));
  const filled = 1 - vessel.composition.volumeL / vessel.volumeL;
  const trace = !(carbonyls > TRACE * least);
  let composition = vessel.composition;
  let start: Float64Array = startOf(sets, vessel);
  let corrections = new Map<MediumCorrection, Correction>();
  let solution: BalanceSolution | undefined;
  let passes = 0;
  let settled = false;
  while (!settled && passes < MOST_PASSES) {
    passes++;
    const freeWater = Math.exp(start[waterAt] ?? 0);
    const next = new Map(
      names.map((name) => [name, correctionOf(name, composition, temperatureK, saltActivity, filled, freeWater)]),
    );
    // A second half of the way, once the simple passes have had their turn, stills a pair of values that would swing.
    const part = passes > MOST_PASSES / 4 ? 0.5 : 1;
    let change = solution ? 0 : Number.POSITIVE_INFINITY;
    for (const [name, correction] of next) {
      const before = corrections.get(name)?.ln ?? correction.ln;
      change = Math.max(change, solution ? Math.abs(correction.ln - before) : Number.POSITIVE_INFINITY);
      next.set(name, { ...correction, ln: before + part * (correction.ln - before) });
    }
    corrections = next;
    if (solution && change < SETTLED) {
      settled = true;
      break;
    }
    applyCorrections(skeleton, corrections);
    solution = solveBalance(system, start);
    start = solution.x;
    if (trace || names.length === 0) settled = true;
    else composition = freeComposition(vessel, freeShares(vessel, solution, species.length), temperatureK);
  }
  return {
    system,
    solution: solution ?? solveBalance(system, start),
    offsets: skeleton.offsets,
    corrections,
    composition,
    passes,
    settled,
    species,
  };
}

function freeShares(vessel: Vessel, solution: BalanceSolution, first: number): Map<string, number> {
  return new Map(
    vessel.ligands.map((ligand, i) => [
      ligand.name,
      Math.min(1, (solution.amounts[first + i] as number) / ligand.total),
    ]),
  );
}
