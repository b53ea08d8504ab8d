/** Numbers with their units, in every style that notes are written in. Hand scanners: linear, no pattern that could run away. */

import { isDigit } from "../compounds/normal-form.ts";
import type { Span } from "../model/span.ts";
import type { Quantity } from "./types.ts";
import { unitAt } from "./units.ts";

export interface NumberReading extends Span {
  readonly value: number;
  readonly low?: number;
  readonly high?: number;
  readonly approximate: boolean;
}

const DASHES = new Set(["-", "–", "—", "−", "‐", "‑"]);

function skipSpaces(text: string, at: number): number {
  let i = at;
  while (
    i < text.length &&
    (text[i] === " " || text[i] === "\u00a0" || text[i] === "\u2009" || text[i] === "\u202f" || text[i] === "\t")
  )
    i++;
  return i;
}

/** One plain number: "1.51", "1,510", "0,5" (decimal comma), "1 200". */
function plainNumber(text: string, at: number): { value: number; end: number } | undefined {
  let i = at;
  if (!isDigit(text[i]) && !(text[i] === "." && isDigit(text[i + 1]))) return undefined;
  let digits = "";
  while (isDigit(text[i])) digits += text[i++];
  // Thousands: groups of exactly three digits behind a comma or thin space.
  while (
    (text[i] === "," || text[i] === "\u2009" || text[i] === "\u202f") &&
    isDigit(text[i + 1]) &&
    isDigit(text[i + 2]) &&
    isDigit(text[i + 3]) &&
    !isDigit(text[i + 4]) &&
    digits.length > 0 &&
    digits.length <= 3 &&
    digits !== "0"
  ) {
    digits += text.slice(i + 1, i + 4);
    i += 4;
  }
  if ((text[i] === "." || text[i] === "·" || text[i] === ",") && isDigit(text[i + 1])) {
    if (text[i] !== "," || !isDigit(text[i + 4]) || digits === "0") {
      digits += ".";
      i++;
      while (isDigit(text[i])) digits += text[i++];
    }
  }
  if (digits.length > 24) return undefined;
  const value = Number(digits);
  return Number.isFinite(value) ? { value, end: i } : undefined;
}

function isApproximate(text: string, at: number): boolean {
  const before = text.slice(Math.max(0, at - 14), at).toLowerCase();
  return /(?:~|≈|∼|ca\.? ?|about |approx(?:\.|imately)? |circa |around )$/.test(before);
}

/** A number, a range ("1.0–1.2", "10 to 12") or a repeat ("3 × 20"), without its unit. */
export function numberAt(text: string, at: number): NumberReading | undefined {
  const first = plainNumber(text, at);
  if (!first) return undefined;
  const approximate = isApproximate(text, at);
  const plain: NumberReading = { start: at, end: first.end, value: first.value, approximate };
  let i = skipSpaces(text, first.end);
  const c = text[i] ?? "";
  if (c === "×" || ((c === "x" || c === "X") && (isDigit(text[i + 1]) || text[i + 1] === " "))) {
    const second = plainNumber(text, skipSpaces(text, i + 1));
    if (second) return { ...plain, end: second.end, value: first.value * second.value };
  }
  if (DASHES.has(c)) i = skipSpaces(text, i + 1);
  else if (text.startsWith("to ", i)) i = skipSpaces(text, i + 3);
  else return plain;
  const second = plainNumber(text, i);
  if (!second || second.value <= first.value) return plain;
  return {
    start: at,
    end: second.end,
    value: (first.value + second.value) / 2,
    low: first.value,
    high: second.value,
    approximate: true,
  };
}

const DEGREES = /^(?:° ?[CcFK]\.?|º ?C\.?|˚ ?C\.?|℃|deg(?:rees)?\.? ?C(?:elsius)?|o ?C(?=[\s.,;)]))/;

function temperature(text: string, number: NumberReading, at: number): Quantity | undefined {
  const head = text.slice(at, at + 12);
  const found = DEGREES.exec(head);
  const kelvin = !found && /^K(?![A-Za-z0-9])/.test(head) && number.value > 150 && number.value < 700;
  if (!found && !kelvin) return undefined;
  const sign =
    DASHES.has(text[number.start - 1] ?? "") &&
    !isDigit(text[number.start - 2]) &&
    !/[A-Za-z]/.test(text[number.start - 2] ?? "")
      ? -1
      : 1;
  const start = sign < 0 ? number.start - 1 : number.start;
  let end = at + (found ? found[0].length : 1);
  if (text[end - 1] === "." && !/^[ ]?[a-z(]/.test(text.slice(end, end + 2))) end--;
  const fahrenheit = found?.[0].includes("F") ?? false;
  const toKelvin = (value: number): number =>
    kelvin ? value : fahrenheit ? ((value - 32) * 5) / 9 + 273.15 : value + 273.15;
  const value = sign * number.value;
  return {
    start,
    end,
    text: text.slice(start, end),
    of: "temperature",
    value,
    unit: kelvin ? "K" : fahrenheit ? "°F" : "°C",
    base: toKelvin(value),
    ...(number.low === undefined || number.high === undefined || sign < 0
      ? {}
      : { range: { low: toKelvin(number.low), high: toKelvin(number.high) } }),
    approximate: number.approximate,
    number: { start, end: number.end },
  };
}

/** The quantity whose number starts at `at`; undefined for a number without a unit that is known. */
export function quantityAt(text: string, at: number): Quantity | undefined {
  const number = numberAt(text, at);
  if (!number) return undefined;
  let i = skipSpaces(text, number.end);
  if (text[i] === "-" && i === number.end && /[a-z]/i.test(text[i + 1] ?? "")) i++;
  const degrees = temperature(text, number, i);
  if (degrees) return degrees;
  const found = unitAt(text, i);
  if (!found || i - number.end > 2) return undefined;
  const { unit } = found;
  let { end } = found;
  // A full stop that ends the sentence is not the unit's.
  if (text[end - 1] === "." && (end >= text.length || /^\s+[A-Z]/.test(text.slice(end, end + 3)))) end--;
  return {
    start: at,
    end,
    text: text.slice(at, end),
    of: unit.of,
    value: number.value,
    unit: unit.unit,
    base: number.value * unit.factor,
    ...(number.low === undefined || number.high === undefined
      ? {}
      : { range: { low: number.low * unit.factor, high: number.high * unit.factor } }),
    approximate: number.approximate,
    number: { start: at, end: number.end },
  };
}

/** "a:b", "a:b:c" or "a/b" with small numbers: parts of a mixture. */
export function ratioAt(text: string, at: number): (Span & { readonly parts: readonly number[] }) | undefined {
  const parts: number[] = [];
  let i = at;
  let end = at;
  for (;;) {
    const number = plainNumber(text, i);
    if (!number || number.value > 1000) break;
    parts.push(number.value);
    end = number.end;
    const next = skipSpaces(text, end);
    if (text[next] !== ":" && text[next] !== "/" && text[next] !== "∶") break;
    i = skipSpaces(text, next + 1);
    if (!isDigit(text[i])) break;
  }
  return parts.length > 1 && parts.every((part) => part > 0) ? { start: at, end, parts } : undefined;
}
