/** Ratios to shares, with central 95 % bounds that stay inside (0, 1): errors are carried on the logit of each share. */

import type { Interval } from "../model/contract.ts";
import type { FormRatio } from "./site-ratios.ts";

/** Two-sided 95 % point of the normal distribution. */
const Z95 = 1.959964;

export interface Shares {
  readonly free: Interval;
  /** In the order of the ratios. */
  readonly forms: readonly Interval[];
}

function logistic(x: number): number {
  return x >= 0 ? 1 / (1 + Math.exp(-x)) : Math.exp(x) / (1 + Math.exp(x));
}

/** Share `index` of all, its bounds by first-order propagation of every independent source on the logit. */
function shareOf(
  index: number,
  ln: readonly number[],
  errors: readonly Readonly<Record<string, number>>[],
  sources: readonly string[],
): Interval {
  const others = ln.map((value, i) => (i === index ? Number.NEGATIVE_INFINITY : value));
  const top = Math.max(...others);
  const total = others.reduce((sum, value) => sum + Math.exp(value - top), 0);
  const logit = (ln[index] as number) - top - Math.log(total);
  let variance = 0;
  for (const source of sources) {
    let effect = errors[index]?.[source] ?? 0;
    others.forEach((value, j) => {
      effect -= (Math.exp(value - top) / total) * (errors[j]?.[source] ?? 0);
    });
    variance += (effect * Math.LN10) ** 2;
  }
  const half = Z95 * Math.sqrt(variance);
  return { value: logistic(logit), low: logistic(logit - half), high: logistic(logit + half) };
}

/** Shares of the free C=O and of each form of one site; they add up to 1. */
export function sharesOf(ratios: readonly FormRatio[]): Shares {
  if (ratios.length === 0) return { free: { value: 1, low: 1, high: 1 }, forms: [] };
  const ln = [0, ...ratios.map((ratio) => ratio.ln)];
  const errors = [{}, ...ratios.map((ratio) => ratio.errors)];
  const sources = [...new Set(ratios.flatMap((ratio) => Object.keys(ratio.errors)))];
  return {
    free: shareOf(0, ln, errors, sources),
    forms: ratios.map((_, i) => shareOf(i + 1, ln, errors, sources)),
  };
}
