/** The buffers table. */

import table from "../generated/buffers.json" with { type: "json" };

export interface Buffer {
  readonly key: string;
  readonly synonyms: readonly string[];
  readonly kind: string;
  /** At 25 °C and zero ionic strength, with the change per kelvin of each. */
  readonly pKa: readonly number[];
  readonly slopes: readonly number[];
  /** A value ("7.4") or the usual range ("5.8-8.0"). */
  readonly pH: string;
  /** It binds carbonyls itself. */
  readonly reacts: boolean;
  readonly note: string;
  readonly source: string;
}

const ROWS = table as unknown as readonly Buffer[];
const BY_KEY = new Map(ROWS.map((row) => [row.key, row]));

export function allBuffers(): readonly Buffer[] {
  return ROWS;
}

export function bufferByKey(key: string): Buffer | undefined {
  return BY_KEY.get(key);
}

/**
 * pH of a buffer whose pH is not written: the table's value or the middle of its range, moved with temperature by the slope
 * of the pKa nearest to it.
 *
 * @returns undefined for a row without a pH
 */
export function usualPH(buffer: Buffer, temperatureK: number): number | undefined {
  const ends = (buffer.pH.match(/\d+(?:\.\d+)?/g) ?? []).map(Number);
  const first = ends[0];
  if (first === undefined || first > 14) return undefined;
  const middle = ends.length > 1 && (ends[1] as number) <= 14 ? (first + (ends[1] as number)) / 2 : first;
  let slope = 0;
  let nearest = Number.POSITIVE_INFINITY;
  buffer.pKa.forEach((pKa, i) => {
    if (Math.abs(pKa - middle) >= nearest) return;
    nearest = Math.abs(pKa - middle);
    slope = buffer.slopes[i] ?? 0;
  });
  return middle + slope * (temperatureK - 298.15);
}
