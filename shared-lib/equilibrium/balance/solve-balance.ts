/**
 * The coupled mass balance of any number of components: Σ over species of ν·amount = total, with amount = exp(lnA + ν·x).
 *
 * The unknowns are x = ln of the free amounts. Newton's method works on the logarithms of the balances, which are nearly straight lines
 * in x, with a line search on their norm; where that fails (once in a thousand random systems with constants over 50 powers of ten), it
 * starts anew on the convex potential whose gradient the balances are, which has one minimum. Every loop has a fixed bound: at most
 * 3 × MOST_STEPS steps in all.
 */

import { factorCholesky, solveCholesky } from "./linear.ts";

export interface BalanceSystem {
  /** Number of components. */
  readonly components: number;
  /**
   * Stoichiometry: species s holds `nu[k]` of the component `part[k]` for k from `first[s]` to below `first[s + 1]`, never negative.
   * The free component itself is one of the species.
   */
  readonly first: Int32Array;
  readonly part: Int32Array;
  readonly nu: Float64Array;
  /** ln of the amount (mol) of each species when every free amount is e⁰. */
  readonly lnA: Float64Array;
  /** mol of each component in all species, above 0. */
  readonly totals: Float64Array;
}

export interface BalanceSolution {
  readonly x: Float64Array;
  /** mol of each species. */
  readonly amounts: Float64Array;
  readonly steps: number;
  /** Largest |ln(sum/total)| at the end. */
  readonly residual: number;
}

export const MOST_STEPS = 100;
export const MOST_HALVINGS = 40;
const MOST_SWEEPS = 60;
const TOLERANCE = 1e-13;
/** Squared norm below which a step that does not help is rounding. */
const ROUNDING = 1e-22;
/** Largest |ln(sum/total)| of a good solution. */
const SOUND = 1e-9;
/** ln of a sum over its total from which on a start is lowered first. */
const FAR = 3;
/** Largest exponent, so that no amount overflows. */
const HIGHEST = 600;
/** Longest step of one unknown, e-folds. */
const LONGEST = 30;

/** Working arrays of one solution. */
interface Scratch {
  readonly amounts: Float64Array;
  readonly sums: Float64Array;
  readonly logs: Float64Array;
  readonly trial: Float64Array;
  readonly direction: Float64Array;
  readonly gram: Gram;
}

/** Σ ν ν amount, scaled by 1/√sum on both sides so that traces and bulk weigh the same; its Cholesky factor. */
export interface Gram {
  readonly factor: Float64Array;
  readonly scale: Float64Array;
}

export function emptyGram(components: number): Gram {
  return { factor: new Float64Array(components * components), scale: new Float64Array(components) };
}

/** Amounts at x, the logs of the balances, and the squared norm of these. */
function amountsAt(system: BalanceSystem, x: Float64Array, scratch: Scratch): number {
  const { first, part, nu, lnA, totals } = system;
  const { amounts, sums, logs } = scratch;
  sums.fill(0);
  let k = 0;
  for (let s = 0; s < amounts.length; s++) {
    const end = first[s + 1] as number;
    let ln = lnA[s] as number;
    for (let q = k; q < end; q++) ln += (nu[q] as number) * (x[part[q] as number] as number);
    const amount = Math.exp(Math.min(ln, HIGHEST));
    amounts[s] = amount;
    for (; k < end; k++) {
      const i = part[k] as number;
      sums[i] = (sums[i] as number) + (nu[k] as number) * amount;
    }
  }
  let norm = 0;
  for (let i = 0; i < sums.length; i++) {
    const log = Math.log(Math.max(sums[i] as number, 1e-300) / (totals[i] as number));
    logs[i] = log;
    norm += log * log;
  }
  return norm;
}

/** Builds and factors the scaled Gram matrix; false when rounding leaves it without a factor. */
export function factorGram(system: BalanceSystem, amounts: Float64Array, gram: Gram): boolean {
  const { components: n, first, part, nu } = system;
  const { factor, scale } = gram;
  factor.fill(0);
  scale.fill(0);
  for (let s = 0; s < amounts.length; s++) {
    const amount = amounts[s] as number;
    const end = first[s + 1] as number;
    for (let k = first[s] as number; k < end; k++) {
      const i = part[k] as number;
      const a = (nu[k] as number) * amount;
      scale[i] = (scale[i] as number) + a;
      for (let q = first[s] as number; q < end; q++) {
        const at = i * n + (part[q] as number);
        factor[at] = (factor[at] as number) + a * (nu[q] as number);
      }
    }
  }
  for (let i = 0; i < n; i++) scale[i] = 1 / Math.sqrt(Math.max(scale[i] as number, 1e-300));
  for (let i = 0; i < n; i++)
    for (let j = 0; j <= i; j++)
      factor[i * n + j] = (factor[i * n + j] as number) * (scale[i] as number) * (scale[j] as number);
  return factorCholesky(factor, n);
}

/** −J⁻¹·g of the log balances into `direction`; false when there is none. */
function newtonDirection(system: BalanceSystem, scratch: Scratch): boolean {
  const { amounts, logs, direction, gram } = scratch;
  if (!factorGram(system, amounts, gram)) return false;
  // J = diag(1/S)·G and G = diag(1/c)·M·diag(1/c) with c = 1/√S, so −J⁻¹·g = −c·M⁻¹·(g/c).
  for (let i = 0; i < direction.length; i++) direction[i] = -(logs[i] as number) / (gram.scale[i] as number);
  solveCholesky(gram.factor, direction.length, direction);
  let longest = 0;
  for (let i = 0; i < direction.length; i++) {
    direction[i] = (direction[i] as number) * (gram.scale[i] as number);
    longest = Math.max(longest, Math.abs(direction[i] as number));
  }
  if (!Number.isFinite(longest)) return false;
  // Shortened as a whole: a direction bent at one unknown would no longer lead downhill.
  if (longest > LONGEST)
    for (let i = 0; i < direction.length; i++) direction[i] = ((direction[i] as number) * LONGEST) / longest;
  return true;
}

/** One pass of single-balance Newton steps: each balance rises with its own unknown. */
function sweep(system: BalanceSystem, x: Float64Array, scratch: Scratch): number {
  const { first, part, nu } = system;
  const { amounts, sums, logs } = scratch;
  for (let i = 0; i < system.components; i++) {
    amountsAt(system, x, scratch);
    let slope = 0;
    for (let s = 0; s < amounts.length; s++)
      for (let k = first[s] as number; k < (first[s + 1] as number); k++)
        if (part[k] === i) slope += (nu[k] as number) ** 2 * (amounts[s] as number);
    if (slope > 0) x[i] = (x[i] as number) - ((logs[i] as number) * (sums[i] as number)) / slope;
  }
  return amountsAt(system, x, scratch);
}

/** Halves the Newton step until the norm falls; the new norm, or undefined when it never does. */
function lineSearch(system: BalanceSystem, x: Float64Array, norm: number, scratch: Scratch): number | undefined {
  const { trial, direction } = scratch;
  let scale = 1;
  for (let halving = 0; halving < MOST_HALVINGS; halving++, scale /= 2) {
    for (let i = 0; i < x.length; i++) trial[i] = (x[i] as number) + scale * (direction[i] as number);
    const next = amountsAt(system, trial, scratch);
    if (next < norm * (1 - 1e-4 * scale)) {
      x.set(trial);
      return next;
    }
  }
  return undefined;
}

/**
 * Lowers all unknowns alike until no sum is above its total (each sum falls at least as fast): there the free parts keep the Gram matrix
 * well conditioned, where a species far above every total would drown them.
 */
function lowered(system: BalanceSystem, x: Float64Array, scratch: Scratch): number {
  const norm = amountsAt(system, x, scratch);
  let most = 0;
  for (const log of scratch.logs) most = Math.max(most, log);
  if (!(most > FAR)) return norm;
  for (let i = 0; i < x.length; i++) x[i] = (x[i] as number) - most;
  return amountsAt(system, x, scratch);
}

function worstOf(logs: Float64Array): number {
  let worst = 0;
  for (const log of logs) worst = Math.max(worst, Math.abs(log));
  return worst;
}

/** Newton on the logs of the balances; the number of steps. The amounts and logs in `scratch` are those at the last x. */
function newtonOnLogs(system: BalanceSystem, x: Float64Array, scratch: Scratch): number {
  let norm = lowered(system, x, scratch);
  let steps = 0;
  let sweeps = 0;
  while (norm > TOLERANCE ** 2 && steps < MOST_STEPS) {
    steps++;
    const next = newtonDirection(system, scratch) ? lineSearch(system, x, norm, scratch) : undefined;
    if (next !== undefined) norm = next;
    else {
      if (sweeps++ >= MOST_SWEEPS || norm < ROUNDING) break;
      norm = sweep(system, x, scratch);
    }
  }
  amountsAt(system, x, scratch);
  return steps;
}

/** Σ amounts − Σ total·x: convex in x, with the balances as its gradient, so its one minimum is the solution. */
function potential(system: BalanceSystem, x: Float64Array, amounts: Float64Array): number {
  let sum = 0;
  for (const amount of amounts) sum += amount;
  for (let i = 0; i < x.length; i++) sum -= (system.totals[i] as number) * (x[i] as number);
  return sum;
}

/** Damped Newton on the convex potential, for the rare system where the logs lead into a narrow valley; the number of steps. */
function newtonOnPotential(system: BalanceSystem, x: Float64Array, scratch: Scratch): number {
  const { sums, direction, trial, gram, amounts } = scratch;
  lowered(system, x, scratch);
  let value = potential(system, x, amounts);
  let steps = 0;
  while (steps < MOST_STEPS) {
    steps++;
    if (!factorGram(system, amounts, gram)) break;
    for (let i = 0; i < x.length; i++)
      direction[i] = ((system.totals[i] as number) - (sums[i] as number)) * (gram.scale[i] as number);
    const gradient = Float64Array.from(direction);
    solveCholesky(gram.factor, x.length, direction);
    let slope = 0;
    let longest = 0;
    for (let i = 0; i < x.length; i++) {
      slope -= (gradient[i] as number) * (direction[i] as number);
      direction[i] = (direction[i] as number) * (gram.scale[i] as number);
      longest = Math.max(longest, Math.abs(direction[i] as number));
    }
    let scale = Math.min(1, LONGEST / Math.max(longest, 1e-300));
    let improved = false;
    for (let halving = 0; halving < MOST_HALVINGS && !improved; halving++, scale /= 2) {
      for (let i = 0; i < x.length; i++) trial[i] = (x[i] as number) + scale * (direction[i] as number);
      amountsAt(system, trial, scratch);
      const next = potential(system, trial, amounts);
      improved = next < value + 1e-4 * scale * slope;
      if (improved) {
        x.set(trial);
        value = next;
      }
    }
    if (!improved) break;
  }
  return steps;
}

/**
 * Solves the balances; always ends, and always gives finite amounts.
 *
 * @param start first guess of x; without one, every component is taken as free
 */
export function solveBalance(system: BalanceSystem, start?: Float64Array): BalanceSolution {
  const n = system.components;
  const x = start ? Float64Array.from(start) : Float64Array.from(system.totals, (total) => Math.log(total));
  const scratch: Scratch = {
    amounts: new Float64Array(system.lnA.length),
    sums: new Float64Array(n),
    logs: new Float64Array(n),
    trial: new Float64Array(n),
    direction: new Float64Array(n),
    gram: emptyGram(n),
  };
  let steps = newtonOnLogs(system, x, scratch);
  if (worstOf(scratch.logs) > SOUND) {
    x.set(system.totals.map((total) => Math.log(total)));
    steps += newtonOnPotential(system, x, scratch) + newtonOnLogs(system, x, scratch);
  }
  amountsAt(system, x, scratch);
  return { x, amounts: scratch.amounts, steps, residual: worstOf(scratch.logs) };
}
