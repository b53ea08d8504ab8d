/** The plotted figures as a table on the page and as CSV. */

import type { Curves } from "../../../../server/protocol.ts";

/** RFC 4180; shares as fractions with their bounds. */
export function csvOf(curves: Curves): string {
  const quoted = (text: string): string => `"${text.replaceAll('"', '""')}"`;
  const head = [curves.axisLabel, ...curves.curves.flatMap(({ label }) => [label, `${label}, low`, `${label}, high`])];
  const rows = curves.x.map((x, i) => [
    x,
    ...curves.curves.flatMap(({ value, low, high }) => [value[i] ?? 0, low[i] ?? 0, high[i] ?? 0]),
  ]);
  return [head.map(quoted).join(","), ...rows.map((row) => row.join(","))].join("\r\n");
}

const EVERY = 4;

/** Every fourth point, so that the table can be read to its end. */
export function fillTable(box: HTMLElement, curves: Curves): void {
  const table = document.createElement("table");
  const head = table.createTHead().insertRow();
  for (const label of [curves.axisLabel, ...curves.curves.map((curve) => `${curve.label} (%)`)]) {
    const cell = document.createElement("th");
    cell.scope = "col";
    cell.textContent = label;
    head.append(cell);
  }
  const body = table.createTBody();
  curves.x.forEach((x, i) => {
    if (i % EVERY !== 0) return;
    const row = body.insertRow();
    const name = document.createElement("th");
    name.scope = "row";
    name.textContent = String(Number(x.toPrecision(3)));
    row.append(name);
    for (const { value, low, high } of curves.curves)
      row.insertCell().textContent = [value, low, high]
        .map((list) => ((list[i] ?? 0) * 100).toPrecision(3))
        .join(" / ");
  });
  const caption = table.createCaption();
  caption.textContent = "Best value / lower bound / upper bound";
  box.replaceChildren(table);
}
