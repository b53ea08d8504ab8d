/** Charge tables in Markdown: any order of columns; a number without a unit takes the unit of its column's heading. */

import type { Binding } from "./bind.ts";
import { numberAt } from "./quantities.ts";
import type { Item } from "./scan.ts";
import type { Quantity } from "./types.ts";
import { type Unit, unitAt } from "./units.ts";

interface Cell {
  readonly start: number;
  readonly end: number;
}

function cellsOf(text: string, start: number, end: number): Cell[] {
  const cells: Cell[] = [];
  let from = start;
  for (let i = start; i <= end; i++) {
    if (i < end && (text[i] !== "|" || text[i - 1] === "\\")) continue;
    if (i > from || i < end) cells.push({ start: from, end: i });
    from = i + 1;
  }
  // The bars at both ends make empty first and last cells.
  return cells.filter(
    (cell, i) => !((i === 0 || i === cells.length - 1) && text.slice(cell.start, cell.end).trim() === ""),
  );
}

/** Unit that a column's heading says: "mass / mg", "n (mmol)", "equiv". */
function headingUnit(heading: string): Unit | undefined {
  for (let i = 0; i < heading.length; i++) {
    if (i > 0 && /[A-Za-z0-9]/.test(heading[i - 1] as string)) continue;
    const found = unitAt(heading, i);
    if (found) return found.unit;
  }
  return undefined;
}

function bareQuantity(text: string, cell: Cell, unit: Unit): Quantity | undefined {
  let at = cell.start;
  while (at < cell.end && !/[0-9.]/.test(text[at] as string)) at++;
  const number = at < cell.end ? numberAt(text, at) : undefined;
  if (!number || number.end > cell.end) return undefined;
  return {
    start: at,
    end: number.end,
    text: text.slice(at, number.end),
    of: unit.of,
    value: number.value,
    unit: unit.unit,
    base: number.value * unit.factor,
    approximate: number.approximate,
    number: { start: at, end: number.end },
  };
}

/** Bindings row by row: the first name of a row is the reagent, the row's quantities are its amounts. */
export function readTable(text: string, items: readonly Item[]): readonly Binding[] {
  const bindings: Binding[] = [];
  let units: (Unit | undefined)[] | undefined;
  let lineStart = 0;
  while (lineStart < text.length) {
    const newline = text.indexOf("\n", lineStart);
    const lineEnd = newline < 0 ? text.length : newline;
    const line = text.slice(lineStart, lineEnd);
    const cells = cellsOf(text, lineStart, lineEnd);
    if (!units) units = cells.map((cell) => headingUnit(text.slice(cell.start, cell.end)));
    else if (!/^[\s|:-]+$/.test(line)) {
      const from = lineStart;
      const to = lineEnd;
      const inRow = items.flatMap((item, i) => (item.start >= from && item.end <= to ? [i] : []));
      const name = inRow.find((i) => items[i]?.kind === "name");
      if (name !== undefined) {
        const written = inRow.flatMap((i) => {
          const item = items[i] as Item;
          return item.kind === "quantity" && item.quantity.of !== "temperature" && item.quantity.of !== "time"
            ? [item.quantity]
            : [];
        });
        const bare = cells.flatMap((cell, column) => {
          const unit = units?.[column];
          const hasOwn = written.some((quantity) => quantity.start >= cell.start && quantity.end <= cell.end);
          const holdsName = (items[name] as Item).start >= cell.start && (items[name] as Item).end <= cell.end;
          const quantity = unit && !hasOwn && !holdsName ? bareQuantity(text, cell, unit) : undefined;
          return quantity ? [quantity] : [];
        });
        const amounts = [...written, ...bare].sort((a, b) => a.start - b.start);
        bindings.push({
          name,
          amounts,
          first: inRow[0] as number,
          last: inRow.at(-1) as number,
          inside: inRow.filter((i) => i !== name && items[i]?.kind === "name"),
        });
      }
    }
    lineStart = lineEnd + 1;
  }
  return bindings;
}
