/** Figures as the margin writes them: short, with bounds, read aloud well. */

import type { Interval } from "../model/contract.ts";

/** "54 %", "< 0.1 %", "> 99.9 %". */
export function percent(share: number): string {
  const hundred = share * 100;
  if (hundred < 0.1) return "< 0.1 %";
  if (hundred > 99.9) return "> 99.9 %";
  if (hundred < 10 || hundred > 99) return `${trimmed(hundred, hundred < 1 ? 1 : hundred > 99 ? 3 : 2)} %`;
  return `${Math.round(hundred)} %`;
}

/** "54 % (48 to 60)". */
export function percentWithBounds(share: Interval): string {
  const low = percent(share.low).replace(" %", "");
  const high = percent(share.high).replace(" %", "");
  return low === high ? percent(share.value) : `${percent(share.value)} (${low} to ${high})`;
}

/** An amount in mol with a unit that suits it: "4.60 mmol". */
export function amountText(mol: number): string {
  return withUnit(mol, [
    [1, "mol"],
    [1e-3, "mmol"],
    [1e-6, "µmol"],
    [1e-9, "nmol"],
  ]);
}

/** A mass in g: "1.65 g". */
export function massText(grams: number): string {
  return withUnit(grams, [
    [1000, "kg"],
    [1, "g"],
    [1e-3, "mg"],
    [1e-6, "µg"],
  ]);
}

/** A volume in L: "0.81 mL". */
export function volumeText(litres: number): string {
  return withUnit(litres, [
    [1, "L"],
    [1e-3, "mL"],
    [1e-6, "µL"],
  ]);
}

function withUnit(value: number, units: readonly (readonly [number, string])[]): string {
  const fitting = units.find(([size]) => Math.abs(value) >= size) ?? units.at(-1);
  return fitting ? `${trimmed(value / fitting[0], 3)} ${fitting[1]}` : String(value);
}

/** So many significant digits, written out without an exponent. */
export function trimmed(value: number, digits: number): string {
  if (value === 0) return "0";
  const rounded = Number(value.toPrecision(digits));
  const decimals = Math.max(0, digits - 1 - Math.floor(Math.log10(Math.abs(rounded))));
  return rounded.toFixed(Math.min(12, decimals));
}

/** Seconds as a chemist says them: "20 s", "15 min", "3 h", "2 d". */
export function timeText(seconds: number): string {
  if (seconds < 100) return `${trimmed(seconds, seconds < 10 ? 1 : 2)} s`;
  if (seconds < 100 * 60) return `${Math.round(seconds / 60)} min`;
  if (seconds < 72 * 3600) return `${trimmed(seconds / 3600, 2)} h`;
  return `${Math.round(seconds / 86400)} d`;
}
