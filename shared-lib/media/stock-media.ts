/** Media that come mixed: strengths of ethanol, denatured alcohol, wet solvents, dilute acids and bases. */

import table from "../generated/stock-media.json" with { type: "json" };
import type { MediumAmount } from "./composition.ts";
import { solventByKey } from "./solvents.ts";

export interface StockMedium {
  readonly key: string;
  readonly synonyms: readonly string[];
  /** Mass fractions by key of the solvents table; they add up to 1. */
  readonly parts: readonly (readonly [string, number])[];
  /** mol per kg of water by key of the salts table. */
  readonly salts: readonly (readonly [string, number])[];
  /** pH, or the acidity function H0 where it is below 0. */
  readonly pH?: number;
  readonly note: string;
  readonly source: string;
}

const ROWS = table as unknown as readonly StockMedium[];

function plain(name: string): string {
  return name.toLowerCase().replaceAll(" ", "");
}

const BY_NAME = new Map(ROWS.flatMap((row) => [row.key, ...row.synonyms].map((name) => [plain(name), row] as const)));

/** The stock medium of that name; case and spaces do not matter ("95% EtOH", "Wet ether"). */
export function stockMediumNamed(name: string): StockMedium | undefined {
  return BY_NAME.get(plain(name));
}

/** mol of each solvent in a mass (g) of a stock medium. */
export function stockAmounts(medium: StockMedium, massG: number): readonly MediumAmount[] {
  return medium.parts.flatMap(([key, share]) => {
    const solvent = solventByKey(key);
    return solvent ? [{ solvent: key, amount: (massG * share) / solvent.molarMass }] : [];
  });
}

export function allStockMedia(): readonly StockMedium[] {
  return ROWS;
}

/** Ethanol by volume of the finished mixture (%) and by mass (%), 20 °C: CRC Handbook, concentrative properties of aqueous solutions (densities read). */
const ETHANOL_STRENGTH: readonly (readonly [number, number])[] = [
  [0, 0],
  [10, 8.0],
  [20, 16.2],
  [40, 33.3],
  [50, 42.4],
  [70, 62.4],
  [80, 73.5],
  [90, 85.7],
  [95, 92.4],
  [96, 93.8],
  [97.2, 95.6],
  [99, 98.4],
  [99.5, 99.2],
  [100, 100],
];

/** Mass fraction of ethanol in aqueous ethanol of a strength in percent by volume of the finished mixture (0 to 100). */
export function ethanolMassFraction(volumePercent: number): number {
  const strength = Math.max(0, Math.min(100, volumePercent));
  let from = ETHANOL_STRENGTH[0] as readonly [number, number];
  for (const to of ETHANOL_STRENGTH) {
    if (strength <= to[0] && to[0] > from[0])
      return (from[1] + ((to[1] - from[1]) * (strength - from[0])) / (to[0] - from[0])) / 100;
    from = to;
  }
  return strength === 0 ? 0 : 1;
}
