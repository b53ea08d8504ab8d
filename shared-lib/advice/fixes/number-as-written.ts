/** Writes a new figure in the place of an old one, as its writer writes figures. */

import type { TextEdit } from "../../model/contract.ts";
import type { Quantity } from "../../notes/types.ts";
import { trimmed } from "../figures.ts";

/** A corrected figure keeps the writer's digits, but never so few that the correction is rounded away. */
const LEAST_DIGITS = 3;

interface Writing {
  readonly value: number;
  readonly digits: number;
  readonly point: "." | ",";
  readonly thousands: "" | "," | " ";
}

/** Digits, and at most points, commas and spaces between them; anything else ("½", "5–10") is not rewritten. */
function readWriting(text: string, expected: number): Writing | undefined {
  let digits = "";
  for (const character of text) {
    if (character >= "0" && character <= "9") digits += character;
    else if (character !== "." && character !== "," && character !== " ") return undefined;
  }
  if (digits === "") return undefined;
  const significant = digits.replace(/^0+/, "").length;
  const candidates: readonly Omit<Writing, "digits" | "value">[] = [
    { point: ".", thousands: "," },
    { point: ".", thousands: " " },
    { point: ",", thousands: " " },
    { point: ".", thousands: "" },
    { point: ",", thousands: "" },
  ];
  for (const { point, thousands } of candidates) {
    if (thousands !== "" && !text.includes(thousands)) continue;
    const plain = text.split(thousands === "" ? "\u0000" : thousands).join("");
    if (plain.split(point).length > 2 || plain.includes(point === "." ? "," : ".")) continue;
    const value = Number(plain.replace(point, "."));
    if (Math.abs(value - expected) <= 1e-9 * Math.abs(expected))
      return { value, digits: significant, point, thousands };
  }
  return undefined;
}

/**
 * The edit that puts `factor` times the written figure in its place: same unit, same decimal sign, same digits (at least three).
 *
 * @returns undefined for a range, or a figure that is not plain digits
 */
export function scaledQuantity(text: string, quantity: Quantity, factor: number): TextEdit | undefined {
  if (quantity.range || !(factor > 0) || !Number.isFinite(factor)) return undefined;
  const { start, end } = quantity.number;
  const written = text.slice(start, end);
  const writing = readWriting(written, quantity.value);
  if (!writing) return undefined;
  const [whole = "", fraction] = plainFigure(writing, writing.value * factor).split(".");
  const grouped = writing.thousands === "" ? whole : groupsOfThree(whole, writing.thousands);
  return { start, end, text: fraction === undefined ? grouped : `${grouped}${writing.point}${fraction}` };
}

/** A comma with three digits behind it would be read as thousands: one digit more tells them apart. */
function plainFigure(writing: Writing, value: number): string {
  const digits = Math.max(LEAST_DIGITS, writing.digits);
  const figure = trimmed(value, digits);
  const [whole = "", fraction = ""] = figure.split(".");
  const ambiguous = writing.point === "," && fraction.length === 3 && whole !== "0" && whole.length <= 3;
  return ambiguous ? trimmed(value, digits + 1) : figure;
}

function groupsOfThree(whole: string, sign: string): string {
  let grouped = "";
  for (let i = 0; i < whole.length; i += 1) {
    if (i > 0 && (whole.length - i) % 3 === 0) grouped += sign;
    grouped += whole[i];
  }
  return grouped;
}
