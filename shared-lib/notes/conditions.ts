/** What a block says of temperature, pH and time, as events with their places. */

import { solventByKey } from "../media/solvents.ts";
import type { Item } from "./scan.ts";

export type Condition = { readonly start: number; readonly end: number } & (
  | { readonly kind: "temperature"; readonly kelvin: number; readonly reflux: boolean }
  | { readonly kind: "pH"; readonly pH: number }
  | { readonly kind: "hold"; readonly seconds: number }
  | { readonly kind: "remove"; readonly what: "solvent" | "water" }
);

const OVERNIGHT = 16 * 3600;
const ICE = 273.15;
/** Behind these a temperature is a property of a substance. */
const PROPERTY = new Set([
  "mp",
  "m",
  "melting",
  "boiling",
  "bp",
  "b",
  "mp.",
  "point",
  "points",
  "decomposition",
  "dec",
]);

function wordOf(item: Item | undefined): string {
  return item?.kind === "word" ? item.word : "";
}

/** Boiling point (K) of the solvent with the lowest one among those named before; ethanol's where none is known. */
function refluxPoint(solvents: readonly string[]): number {
  const points = solvents.flatMap((key) => solventByKey(key)?.boilingC ?? []);
  return (points.length > 0 ? Math.min(...points) : 78) + 273.15;
}

/** Conditions in the order of the text. `roomC`: what room temperature means, °C; `solvents`: what is in the flask, for reflux. */
export function readConditions(
  items: readonly Item[],
  roomC: number,
  solvents: readonly string[],
): readonly Condition[] {
  const found: Condition[] = [];
  items.forEach((item, i) => {
    const { start, end } = item;
    const before = wordOf(items[i - 1]);
    if (item.kind === "quantity") {
      if (item.quantity.of === "temperature" && !PROPERTY.has(before) && item.quantity.base > 0)
        found.push({ kind: "temperature", start, end, kelvin: item.quantity.base, reflux: false });
      if (item.quantity.of === "time")
        found.push({ kind: "hold", start, end, seconds: item.quantity.range?.high ?? item.quantity.base });
    }
    if (item.kind === "pH") found.push({ kind: "pH", start, end, pH: item.pH });
    if (item.kind !== "word") return;
    const next = wordOf(items[i + 1]);
    if ((item.word === "room" || item.word === "ambient") && next.startsWith("temp"))
      found.push({ kind: "temperature", start, end: items[i + 1]?.end ?? end, kelvin: roomC + 273.15, reflux: false });
    else if (item.word === "rt" || (item.word === "r" && items[i + 1]?.kind === "mark" && wordOf(items[i + 2]) === "t"))
      found.push({ kind: "temperature", start, end, kelvin: roomC + 273.15, reflux: false });
    else if (
      item.word.startsWith("ice") &&
      (item.word.includes("bath") ||
        item.word.includes("cool") ||
        item.word.includes("cold") ||
        next.startsWith("bath") ||
        next.startsWith("cool"))
    )
      found.push({ kind: "temperature", start, end, kelvin: ICE, reflux: false });
    else if (item.word.startsWith("reflux"))
      found.push({ kind: "temperature", start, end, kelvin: refluxPoint(solvents), reflux: true });
    else if (item.word === "overnight") found.push({ kind: "hold", start, end, seconds: OVERNIGHT });
  });
  return found;
}

/** A temperature as it is given to an estimate: "25", "25 °C", "298 K", "rt". @returns K, or undefined */
export function readTemperature(text: string): number | undefined {
  const trimmed = text.trim();
  if (/^(?:rt|r\.t\.|room temperature)$/i.test(trimmed)) return 298.15;
  const found = /^([-−–]?)(\d{1,5}(?:[.,]\d{1,6})?) ?(°?C|K|°)?$/.exec(trimmed);
  if (!found) return undefined;
  const value = Number((found[2] as string).replace(",", ".")) * (found[1] ? -1 : 1);
  return found[3] === "K" ? value : value + 273.15;
}
