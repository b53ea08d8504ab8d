/** The buffers table. */

import table from "../generated/buffers.json" with { type: "json" };

export interface Buffer {
  readonly key: string;
  readonly synonyms: readonly string[];
  readonly kind: "buffer" | "medium" | "saturated salt";
  /** At 25 °C and zero ionic strength, with the change per kelvin of each. */
  readonly pKa: readonly number[];
  readonly slopes: readonly number[];
  /** Usual range at 25 °C; both ends the same for one usual value, absent where the pH is open. */
  readonly pHRange?: readonly [number, number];
  /** mol/L, usual. */
  readonly molarity?: number;
  /** What lowers the activity of water (key of the salts table), in mol per kg of water; "saturated" over the solid. */
  readonly salt?: { readonly salt: string; readonly molality: number | "saturated" };
  /** It binds carbonyls itself: as an amine, a thiol, bisulfite, borate … */
  readonly reacts: "yes" | "weak" | "no";
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

/** Change of pH per kelvin: the slope of the pKa nearest to it; 0 more than 2 units away, where the pair no longer sets the pH. */
function slopeAt(buffer: Buffer, pH: number): number {
  let slope = 0;
  let nearest = 2;
  buffer.pKa.forEach((pKa, i) => {
    const away = Math.abs(pKa - pH);
    if (away >= nearest) return;
    nearest = away;
    slope = buffer.slopes[i] ?? 0;
  });
  return slope;
}

/**
 * pH of a buffer at a temperature.
 *
 * @param pH25 the pH as written, which a buffer is set to at room temperature; absent: the middle of the usual range
 * @returns undefined for a row without a usual pH when none is given
 */
export function bufferPH(buffer: Buffer, temperatureK: number, pH25?: number): number | undefined {
  const start = pH25 ?? (buffer.pHRange ? (buffer.pHRange[0] + buffer.pHRange[1]) / 2 : undefined);
  return start === undefined ? undefined : start + slopeAt(buffer, start) * (temperatureK - 298.15);
}

/** pH of a buffer whose pH is not written, at a temperature; undefined for a row without a usual pH. */
export function usualPH(buffer: Buffer, temperatureK: number): number | undefined {
  return bufferPH(buffer, temperatureK);
}
