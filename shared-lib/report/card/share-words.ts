/** Shares, temperatures and times in a reader's words. */

import type { Interval } from "../../model/contract.ts";

/** A share of 1 in percent with the digits that carry meaning: "54 %", "0.2 %", "99.96 %". */
export function percent(share: number): string {
  return `${percentDigits(share)} %`;
}

/** Figures alone, without the sign. */
export function percentDigits(share: number): string {
  const inPercent = Math.min(1, Math.max(0, share)) * 100;
  const rest = Math.min(inPercent, 100 - inPercent);
  if (rest === 0) return inPercent.toFixed(0);
  if (rest >= 10) return inPercent.toFixed(0);
  if (rest >= 0.95) return inPercent.toFixed(inPercent < 10 ? 1 : 0);
  if (inPercent > 50) return rest < 0.005 ? "> 99.99" : inPercent.toFixed(rest < 0.095 ? 2 : 1);
  return inPercent < 0.001 ? "< 0.001" : String(Number(inPercent.toPrecision(2)));
}

/** The bounds of a share: "45–63 %". */
export function percentRange(share: Interval): string {
  const low = percentDigits(share.low);
  const high = percentDigits(share.high);
  return low === high ? `${low} %` : `${low}–${high} %`;
}

/** Kelvin as degrees Celsius, at most one decimal. */
export function celsius(kelvin: number): string {
  const degrees = Math.round((kelvin - 273.15) * 10) / 10;
  return `${degrees < 0 ? `−${-degrees}` : degrees} °C`;
}

/** Seconds in the unit a person would say. */
export function duration(seconds: number): string {
  const units: readonly (readonly [number, string])[] = [
    [86_400, "d"],
    [3_600, "h"],
    [60, "min"],
    [1, "s"],
    [1e-3, "ms"],
  ];
  const fit = units.find(([size]) => seconds >= size * 0.95) ?? (units[units.length - 1] as readonly [number, string]);
  const figure = seconds / fit[0];
  if (fit[1] === "ms" && figure < 1) return "under 1 ms";
  return `${Number(figure.toPrecision(2))} ${fit[1]}`;
}

const BAR_CELLS = 10;

/** A bar of ten cells; a share above zero shows at least its outline. */
export function shareBar(share: number): string {
  const full = Math.round(Math.min(1, Math.max(0, share)) * BAR_CELLS);
  return "▰".repeat(full) + "▱".repeat(BAR_CELLS - full);
}
