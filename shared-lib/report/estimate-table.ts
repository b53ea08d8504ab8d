/** Estimates over a range of conditions as a table for the terminal. */

import { percentWithBounds, trimmed } from "../advice/figures.ts";
import type { Estimate } from "../model/contract.ts";
import { celsius } from "./card/share-words.ts";

/** A line an estimate; columns for what varies, then the free share and every form that reaches half a percent somewhere. */
export function estimatesAsTable(estimates: readonly Estimate[]): string {
  const [first] = estimates;
  if (!first) return "";
  const labels = [...new Set(estimates.flatMap((one) => one.forms.map((form) => form.label)))].filter((label) =>
    estimates.some((one) => one.forms.some((form) => form.label === label && form.fraction.value >= 0.005)),
  );
  const varies = (of: (one: Estimate) => unknown): boolean => new Set(estimates.map(of)).size > 1;
  const conditions: readonly (readonly [string, (one: Estimate) => string])[] = [
    ...(varies((one) => one.temperature) ? [["T", (one: Estimate) => celsius(one.temperature)] as const] : []),
    ...(varies((one) => one.medium.pH) ? [["pH", (one: Estimate) => trimmed(one.medium.pH ?? 7, 3)] as const] : []),
    ...(varies((one) => one.concentration)
      ? [["mol/L", (one: Estimate) => trimmed(one.concentration ?? 0, 3)] as const]
      : []),
  ];
  const share = (one: Estimate, label: string): string => {
    const form = one.forms.find((candidate) => candidate.label === label);
    return form ? percentWithBounds(form.fraction) : "–";
  };
  const rows = [
    [...conditions.map(([name]) => name), ...labels],
    ...estimates.map((one) => [
      ...conditions.map(([, of]) => of(one)),
      ...(one.outside === undefined ? labels.map((label) => share(one, label)) : [`not estimated: ${one.outside}`]),
    ]),
  ];
  const widths = (rows[0] ?? []).map((_, column) => Math.max(...rows.map((row) => (row[column] ?? "").length)));
  const lines = rows.map((row) =>
    row
      .map((cell, column) => cell.padEnd(widths[column] ?? 0))
      .join("  ")
      .trimEnd(),
  );
  return `${first.compound.name ?? first.compound.input} in ${first.medium.text} (shares with central 95 % bounds)\n${lines.join("\n")}\n`;
}
