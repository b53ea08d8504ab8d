/**
 * The coupled mass balance of any number of components: Σ over species of ν·amount = total, with amount = exp(lnA + ν·x).
 *
 * The unknowns are x = ln of the free amounts. Newton's method works on the logarithms of the balances, which are nearly straight lines
 * in x, with a line search on their norm: the Jacobian is a Gram matrix divided by the sums, never singular, so every Newton direction
 * leads downhill. Where rounding stops it, single balances are solved in turn. Both loops have a fixed bound.
 */

import { factorCholesky, solveCholesky } from "./linear.ts";

export interface BalanceSystem {
  /** Number of components. */
  readonly components: number;
  /** Stoichiometry, species by species: ν of each component, never negative. The free component itself is one of the species. */
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
/** Longest step of one unknown, e-folds. */
const LONGEST = 30;

function amountsAt(system: BalanceSystem, x: Float64Array, amounts: Float64Array, logs: Float64Array): number {
  const { components: n, nu, lnA, totals } = system;
  const sums = new Float64Array(n);
  for (let s = 0; s < amounts.length; s++) {
    let ln = lnA[s] as number;
    for (let i = 0; i < n; i++) ln += (nu[s * n + i] as number) * (x[i] as number);
    const amount = Math.exp(Math.min(ln, 600));
    amounts[s] = amount;
    for (let i = 0; i < n; i++) sums[i] = (sums[i] as number) + (nu[s * n + i] as number) * amount;
  }
  let norm = 0;
  for (let i = 0; i < n; i++) {
    logs[i] = Math.log(Math.max(sums[i] as number, 1e-300) / (totals[i] as number));
    norm += (logs[i] as number) ** 2;
  }
  return norm;
}

/** Σ ν ν amount, scaled by 1/√(sum·sum) so that traces and bulk weigh the same; factored. */
export function gramFactor(
  system: BalanceSystem,
  amounts: Float64Array,
): { readonly factor: Float64Array; readonly scale: Float64Array } | undefined {
  const { components: n, nu } = system;
  const factor = new Float64Array(n * n);
  const scale = new Float64Array(n);
  for (let s = 0; s < amounts.length; s++) {
    const amount = amounts[s] as number;
    for (let i = 0; i < n; i++) {
      const a = (nu[s * n + i] as number) * amount;
      if (a === 0) continue;
      scale[i] = (scale[i] as number) + a;
      for (let j = 0; j <= i; j++) {
        const b = nu[s * n + j] as number;
        if (b !== 0) factor[i * n + j] = (factor[i * n + j] as number) + a * b;
      }
    }
  }
  for (let i = 0; i < n; i++) scale[i] = 1 / Math.sqrt(Math.max(scale[i] as number, 1e-300));
  for (let i = 0; i < n; i++)
    for (let j = 0; j <= i; j++)
      factor[i * n + j] = (factor[i * n + j] as number) * (scale[i] as number) * (scale[j] as number);
  return factorCholesky(factor, n) ? { factor, scale } : undefined;
}

/** −J⁻¹·g of the log balances; undefined when the matrix cannot be factored. */
function newtonDirection(system: BalanceSystem, amounts: Float64Array, logs: Float64Array): Float64Array | undefined {
  const gram = gramFactor(system, amounts);
  if (!gram) return undefined;
  const n = system.components;
  const direction = new Float64Array(n);
  // J_log = diag(1/S)·G and G = diag(1/c)·M·diag(1/c) with c = 1/√S, so −J_log⁻¹ g = −c·M⁻¹·(c·S·g) = −c·M⁻¹·(g/c).
  for (let i = 0; i < n; i++) direction[i] = -(logs[i] as number) / (gram.scale[i] as number);
  solveCholesky(gram.factor, n, direction);
  for (let i = 0; i < n; i++) {
    const step = (direction[i] as number) * (gram.scale[i] as number);
    if (!Number.isFinite(step)) return undefined;
    direction[i] = Math.max(-LONGEST, Math.min(LONGEST, step));
  }
  return direction;
}

/** One pass of single-component Newton steps; each balance rises with its own unknown, so this never leaves its bracket. */
function sweep(system: BalanceSystem, x: Float64Array, amounts: Float64Array, logs: Float64Array): number {
  const { components: n, nu } = system;
  for (let i = 0; i < n; i++) {
    amountsAt(system, x, amounts, logs);
    let sum = 0;
    let slope = 0;
    for (let s = 0; s < amounts.length; s++) {
      const v = nu[s * n + i] as number;
      sum += v * (amounts[s] as number);
      slope += v * v * (amounts[s] as number);
    }
    // slope/sum ≥ 1 whenever ν are whole numbers: the step never overshoots by more than the log itself.
    if (slope > 0) x[i] = (x[i] as number) - ((logs[i] as number) * sum) / slope;
  }
  return amountsAt(system, x, amounts, logs);
}

/**
 * Solves the balances; always ends, and always gives finite amounts.
 *
 * @param start first guess of x; without one, every component is taken as free
 */
export function solveBalance(system: BalanceSystem, start?: Float64Array): BalanceSolution {
  const n = system.components;
  const x = start ? Float64Array.from(start) : Float64Array.from(system.totals, (total) => Math.log(total));
  const amounts = new Float64Array(system.lnA.length);
  const logs = new Float64Array(n);
  const trial = new Float64Array(n);
  let norm = amountsAt(system, x, amounts, logs);
  let steps = 0;
  let sweeps = 0;
  while (norm > TOLERANCE ** 2 && steps < MOST_STEPS) {
    steps++;
    const direction = newtonDirection(system, amounts, logs);
    let improved = false;
    if (direction) {
      let scale = 1;
      for (let halving = 0; halving < MOST_HALVINGS && !improved; halving++, scale /= 2) {
        for (let i = 0; i < n; i++) trial[i] = (x[i] as number) + scale * (direction[i] as number);
        const next = amountsAt(system, trial, amounts, logs);
        improved = next < norm * (1 - 1e-4 * scale);
        if (improved) {
          x.set(trial);
          norm = next;
        }
      }
    }
    if (!improved) {
      if (sweeps++ >= MOST_SWEEPS || norm < 1e-22) break;
      norm = sweep(system, x, amounts, logs);
    }
  }
  amountsAt(system, x, amounts, logs);
  let residual = 0;
  for (let i = 0; i < n; i++) residual = Math.max(residual, Math.abs(logs[i] as number));
  return { x, amounts, steps, residual };
}
