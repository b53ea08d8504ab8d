/** Activity of water over dissolved salts, acids and other solutes: osmotic coefficients, and the humidity over saturated solutions. */

import table from "../generated/salts.json" with { type: "json" };
import { bufferByKey } from "./buffers.ts";

/** Relative humidity over the saturated solution, in %. */
export type Humidity =
  | { readonly form: "polynomial"; readonly coefficients: readonly number[] }
  | { readonly form: "exponential"; readonly factor: number; readonly kelvin: number };

export interface Salt {
  /** Formula or short name ("NaCl"). */
  readonly key: string;
  readonly name: string;
  readonly synonyms: readonly string[];
  readonly cas: string;
  /** Particles per formula unit. */
  readonly particles: number;
  /** Molality and osmotic coefficient, rising in molality. */
  readonly osmotic: readonly (readonly [number, number])[];
  /** mol per kg of water at 25 °C. */
  readonly saturation?: number;
  readonly humidity?: Humidity;
  readonly source: string;
}

const ROWS = table as unknown as readonly Salt[];
const BY_KEY = new Map(ROWS.map((row) => [row.key, row]));
const BY_CAS = new Map(ROWS.map((row) => [row.cas, row]));
/** kg/mol */
const WATER_MASS = 0.018015;

export function allSalts(): readonly Salt[] {
  return ROWS;
}

export function saltByKey(key: string): Salt | undefined {
  return BY_KEY.get(key);
}

export function saltByCas(cas: string): Salt | undefined {
  return BY_CAS.get(cas);
}

/**
 * Activity of water over the saturated solution (Greenspan, J. Res. NBS 1977, 81A, 89; Wexler, CRC Handbook; the table says which).
 * Held to 0–100 °C, where the fits were made (some end at 50 °C).
 *
 * @returns undefined for a solute whose saturated solution is not in the table
 */
export function saturatedActivity(salt: Salt, temperatureK: number): number | undefined {
  const { humidity } = salt;
  if (!humidity) return undefined;
  const kelvin = Math.max(273.15, Math.min(373.15, temperatureK));
  const celsius = kelvin - 273.15;
  const percent =
    humidity.form === "exponential"
      ? humidity.factor * Math.exp(humidity.kelvin / kelvin)
      : humidity.coefficients.reduceRight((sum, coefficient) => sum * celsius + coefficient, 0);
  return Math.max(0.01, Math.min(1, percent / 100));
}

/** Osmotic coefficient at a molality: straight lines between the points of the table, from 1 at zero to the saturated solution. */
function osmoticCoefficient(salt: Salt, molality: number): number {
  let from: readonly [number, number] = [0, 1];
  const points = [...salt.osmotic];
  const saturated = saturatedActivity(salt, 298.15);
  const last = points[points.length - 1]?.[0] ?? 0;
  if (saturated !== undefined && salt.saturation !== undefined && salt.saturation > last * 1.05)
    points.push([salt.saturation, -Math.log(saturated) / (salt.particles * salt.saturation * WATER_MASS)]);
  for (const to of points) {
    if (molality <= to[0]) return from[1] + ((to[1] - from[1]) * (molality - from[0])) / (to[0] - from[0]);
    from = to;
  }
  return from[1];
}

/** Activity of water over one solute (25 °C; it changes by less than 0.01 from 0 to 60 °C), never below its saturated solution. */
export function activityOverSalt(salt: Salt, molality: number, temperatureK: number): number {
  if (!(molality > 0)) return 1;
  const activity = Math.exp(-salt.particles * molality * osmoticCoefficient(salt, molality) * WATER_MASS);
  return Math.min(1, Math.max(activity, saturatedActivity(salt, temperatureK) ?? 0.01));
}

export interface DissolvedSalts {
  /** CAS number and mol of what is dissolved; what is not in the salts table is passed over. */
  readonly solutes: readonly { readonly cas?: string | undefined; readonly amount: number }[];
  /** mol of water that holds it. */
  readonly water: number;
  readonly buffer?: { readonly buffer: string; readonly molarity?: number | undefined } | undefined;
}

/** Osmolality of a buffer per mol/L: two to three particles, osmotic coefficient 0.9. */
const BUFFER_PARTICLES = 2.5;

function activityOfBuffer(buffer: DissolvedSalts["buffer"], temperatureK: number): number {
  const row = buffer ? bufferByKey(buffer.buffer) : undefined;
  if (!row) return 1;
  const salt = row.salt ? saltByKey(row.salt.salt) : undefined;
  if (row.salt && salt)
    return row.salt.molality === "saturated"
      ? (saturatedActivity(salt, temperatureK) ?? activityOverSalt(salt, salt.saturation ?? 0, temperatureK))
      : activityOverSalt(salt, row.salt.molality, temperatureK);
  const molarity = Math.max(0, Math.min(6, buffer?.molarity ?? row.molarity ?? 0));
  return Math.exp(-BUFFER_PARTICLES * 0.9 * molarity * WATER_MASS);
}

/**
 * Activity of the water of a solution over its solutes alone (1 for pure water). Several solutes lower it independently:
 * ln a adds up, which for common salts holds to a few hundredths.
 */
export function saltWaterActivity(dissolved: DissolvedSalts, temperatureK: number): number {
  const kilograms = dissolved.water * WATER_MASS;
  let activity = activityOfBuffer(dissolved.buffer, temperatureK);
  if (kilograms > 0)
    for (const { cas, amount } of dissolved.solutes) {
      const salt = cas === undefined ? undefined : saltByCas(cas);
      if (salt && amount > 0 && Number.isFinite(amount))
        activity *= activityOverSalt(salt, amount / kilograms, temperatureK);
    }
  return Math.max(0.01, activity);
}
