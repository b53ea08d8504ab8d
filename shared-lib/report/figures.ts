/** Figures as a chemist writes them. */

import type { Interval } from "../model/contract.ts";

/** A share in percent with two or three significant digits; "> 99.9" and "< 0.1" at the ends. */
export function percent(share: number): string {
  const value = share * 100;
  if (value > 99.9) return "> 99.9";
  if (value < 0.1) return value < 0.01 ? "< 0.01" : value.toPrecision(1);
  return value >= 10 ? value.toFixed(value > 99 ? 1 : 0) : value.toPrecision(2);
}

/** "53 % (46 to 60)" */
export function boundedPercent(interval: Interval): string {
  return `${percent(interval.value)} % (${percent(interval.low)} to ${percent(interval.high)})`;
}

/** Seconds in the unit that a reader would take. */
export function duration(seconds: number): string {
  if (seconds < 1) return `${(seconds * 1000).toPrecision(2)} ms`;
  if (seconds < 90) return `${Number(seconds.toPrecision(2))} s`;
  if (seconds < 5400) return `${Number((seconds / 60).toPrecision(2))} min`;
  if (seconds < 172_800) return `${Number((seconds / 3600).toPrecision(2))} h`;
  return `${Number((seconds / 86_400).toPrecision(2))} d`;
}
