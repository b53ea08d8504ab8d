/** How far the rules of the media may be off. */

/** Errors of log10 of a ratio by a volume fraction, from the assessments of mixed media; straight lines between the points, falling in share. */
export type ErrorCurve = readonly (readonly [number, number])[];
export const BESIDE_OTHERS: ErrorCurve = [
  [1, 0.02],
  [0.95, 0.1],
  [0.6, 0.1],
  [0.5, 0.25],
  [0.15, 0.25],
  [0.1, 0.5],
  [0, 0.5],
];
export const BESIDE_ALCOHOLS: ErrorCurve = [
  [1, 0.02],
  [0.95, 0.15],
  [0, 0.15],
];
export const ALCOHOL_BESIDE_OTHERS: ErrorCurve = [
  [1, 0.05],
  [0.95, 0.15],
  [0.6, 0.15],
  [0.5, 0.25],
  [0.15, 0.25],
  [0.1, 0.4],
  [0, 0.4],
];
export const ALCOHOL_BESIDE_PROTIC: ErrorCurve = [
  [1, 0.05],
  [0.95, 0.15],
  [0, 0.15],
];

/** Error of log10 at a volume fraction. */
export function errorAt(curve: ErrorCurve, share: number): number {
  let from = curve[0] as readonly [number, number];
  for (const to of curve) {
    if (share >= to[0])
      return to[0] === from[0] ? to[1] : to[1] + ((from[1] - to[1]) * (share - to[0])) / (from[0] - to[0]);
    from = to;
  }
  return from[1];
}

/** Below 0 °C and above 70 °C the error grows, by 0.05 per 20 K, in quadrature. */
export function withTemperature(sd: number, temperatureK: number): number {
  const beyond = Math.max(0, 273.15 - temperatureK, temperatureK - 343.15);
  return beyond > 0 ? Math.hypot(sd, (0.05 * beyond) / 20) : sd;
}
