/**
 * Shares of the forms of one carbonyl with central 95 % bounds. Every independent source of error moves all the constants that rest on
 * it at once; the balance answers (implicit differentiation with the Jacobian of the solution), and the effects are added in quadrature on
 * the logit of each share, so that bounds stay between 0 and 1.
 */

import type { FormShare, Interval } from "../../model/contract.ts";
import { solveCholesky } from "../balance/linear.ts";
import { emptyGram, factorGram } from "../balance/solve-balance.ts";
import type { Species } from "../forms/species.ts";
import type { VesselEquilibrium } from "./equilibrium.ts";

/** Two-sided 95 % point of the normal distribution. */
export const Z95 = 1.959964;
/** Forms below this share are left out of the list. */
const NOTHING = 1e-7;
/** Rest over share below which the rest's own terms are added one by one. */
const SMALL = 1e-3;

type Solved = VesselEquilibrium & { readonly species: readonly Species[] };

/** What moves one species: source of error and d log10 K; the medium's errors are added with the corrections of the moment. */
const listed = new WeakMap<Species, readonly (readonly [string, number])[]>();

function errorsOf(species: Species): readonly (readonly [string, number])[] {
  let list = listed.get(species);
  if (!list) {
    list = Object.entries(species.errors).filter(([, size]) => size !== 0);
    listed.set(species, list);
  }
  return list;
}

/** Sources of error over all species: for each, d log10 K of every species. */
function sourcesOf(solved: Solved): Map<string, Float64Array> {
  const sources = new Map<string, Float64Array>();
  const add = (source: string, s: number, size: number): void => {
    if (size === 0) return;
    let effect = sources.get(source);
    if (!effect) {
      effect = new Float64Array(solved.solution.amounts.length);
      sources.set(source, effect);
    }
    effect[s] = (effect[s] as number) + size;
  };
  solved.species.forEach((one, s) => {
    for (const [source, size] of errorsOf(one)) add(source, s, size);
    for (const { name, count } of one.corrections) add(name, s, count * (solved.corrections.get(name)?.sd ?? 0));
  });
  return sources;
}

/** d ln amount of every species for one standard deviation of each source. */
export function sensitivities(solved: Solved): readonly Float64Array[] {
  const { system, solution } = solved;
  const { components: n, first, part, nu } = system;
  const gram = emptyGram(n);
  if (!factorGram(system, solution.amounts, gram)) return [];
  const b = new Float64Array(n);
  const answers: Float64Array[] = [];
  for (const effect of sourcesOf(solved).values()) {
    b.fill(0);
    for (let s = 0; s < effect.length; s++) {
      const moved = (effect[s] as number) * Math.LN10 * (solution.amounts[s] as number);
      if (moved === 0) continue;
      for (let k = first[s] as number; k < (first[s + 1] as number); k++)
        b[part[k] as number] = (b[part[k] as number] as number) - (nu[k] as number) * moved;
    }
    for (let i = 0; i < n; i++) b[i] = (b[i] as number) * (gram.scale[i] as number);
    solveCholesky(gram.factor, n, b);
    for (let i = 0; i < n; i++) b[i] = (b[i] as number) * (gram.scale[i] as number);
    // The effect itself is no longer needed: the answer takes its place.
    for (let s = 0; s < effect.length; s++) {
      let sum = (effect[s] as number) * Math.LN10;
      for (let k = first[s] as number; k < (first[s + 1] as number); k++)
        sum += (nu[k] as number) * (b[part[k] as number] as number);
      effect[s] = sum;
    }
    answers.push(effect);
  }
  return answers;
}

interface Gathered {
  readonly form: Omit<FormShare, "fraction">;
  value: number;
  readonly moves: Float64Array;
}

function logistic(x: number): number {
  return x >= 0 ? 1 / (1 + Math.exp(-x)) : Math.exp(x) / (1 + Math.exp(x));
}

function bounded(one: Gathered, all: readonly Gathered[], total: number, sums: Float64Array): Interval {
  const value = one.value / total;
  let rest = 0;
  for (const other of all) if (other !== one) rest += other.value;
  if (!(rest > 0) || !(one.value > 0)) return { value, low: value, high: value };
  let variance = 0;
  for (let k = 0; k < one.moves.length; k++) {
    // Where nearly all is in this form, the difference of the sums would lose the digits of the rest.
    let moved = (sums[k] as number) - (one.moves[k] as number);
    if (rest < SMALL * one.value) {
      moved = 0;
      for (const other of all) if (other !== one) moved += other.moves[k] as number;
    }
    const effect = (one.moves[k] as number) / one.value - moved / rest;
    variance += effect * effect;
  }
  const logit = Math.log(one.value / rest);
  const half = Z95 * Math.sqrt(variance);
  return {
    value,
    low: Math.min(value, logistic(logit - half)),
    high: Math.max(value, logistic(logit + half)),
  };
}

/**
 * Forms of a carbonyl whose sets (its sites, or the whole molecule) are `sets`; shares add up to 1, the free carbonyl first.
 *
 * @param moves from `sensitivities`, once for the vessel
 */
export function formShares(solved: Solved, sets: readonly number[], moves: readonly Float64Array[]): FormShare[] {
  const gathered = new Map<string, Gathered>();
  for (const set of sets) {
    const total = (solved.system.totals[set] as number) * sets.length;
    for (let s = solved.offsets[set] as number; s < (solved.offsets[set + 1] as number); s++) {
      const one = solved.species[s] as Species;
      const weight = (one.units * (solved.solution.amounts[s] as number)) / total;
      for (const part of one.parts) {
        const { share } = part;
        let into = gathered.get(part.label);
        if (!into) {
          const { kind, label, smiles } = part;
          const form = smiles === undefined ? { kind, label } : { kind, label, smiles };
          into = { form, value: 0, moves: new Float64Array(moves.length) };
          gathered.set(label, into);
        }
        const counted = weight * share;
        into.value += counted;
        for (let k = 0; k < moves.length; k++)
          into.moves[k] = (into.moves[k] as number) + counted * ((moves[k] as Float64Array)[s] as number);
      }
    }
  }
  const all: Gathered[] = [];
  const sums = new Float64Array(moves.length);
  let total = 0;
  for (const one of gathered.values()) {
    const free = one.form.kind === "free carbonyl";
    if (!free && one.value <= NOTHING) continue;
    if (free) all.unshift(one);
    else all.push(one);
    total += one.value;
    for (let k = 0; k < sums.length; k++) sums[k] = (sums[k] as number) + (one.moves[k] as number);
  }
  return all.map((one) => ({ ...one.form, fraction: bounded(one, all, total, sums) }));
}
