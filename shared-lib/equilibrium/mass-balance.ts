/**
 * Coupled mass balance: every carbonyl takes water or alcohol, and what is left decides how much the others take.
 * Unknowns are the logarithms of the free amounts of the solvents that add; safeguarded Newton with a fixed bound on its steps.
 */

import { type Composition, compositionOf } from "../media/composition.ts";
import { siteSharesOf } from "./site-shares.ts";
import type { Contents, SpeciateOptions } from "./types.ts";

export interface FreeSolvents {
  /** Composition of what is left unbound. */
  readonly composition: Composition;
  /** Volume of the solvents over that of everything: carbonyls in bulk dilute the water too. */
  readonly dilution: number;
  /** False when the bound on the steps was met first (then the last, feasible point is given). */
  readonly converged: boolean;
}

export const MOST_STEPS = 40;
const TOLERANCE = 1e-10;
/** Below this ratio of carbonyl to solvent, binding changes nothing in the third digit. */
const NEGLIGIBLE = 1e-6;
/** g/mL of a carbonyl whose density is not in the table. */
const USUAL_DENSITY = 1;

function carbonylVolume(contents: Contents): number {
  return contents.carbonyls.reduce(
    (sum, row) =>
      sum + (Math.max(0, row.amount) * row.compound.molarMass) / (row.compound.density ?? USUAL_DENSITY) / 1000,
    0,
  );
}

/** mol of each nucleophilic solvent that the carbonyls hold when `composition` is what is free. */
function held(
  contents: Contents,
  composition: Composition,
  dilution: number,
  keys: readonly string[],
  pH: number,
  options: SpeciateOptions,
): number[] {
  const bound = new Map<string, number>();
  for (const row of contents.carbonyls) {
    if (!(row.amount > 0)) continue;
    for (const { shares, site } of siteSharesOf(
      row.compound,
      composition,
      dilution,
      contents.temperatureK,
      pH,
      options,
    )) {
      site.ratios.forEach((ratio, i) => {
        if (ratio.holds)
          bound.set(ratio.holds, (bound.get(ratio.holds) ?? 0) + row.amount * (shares.forms[i]?.value ?? 0));
      });
    }
  }
  return keys.map((key) => bound.get(key) ?? 0);
}

/** Solves J d = −f for two or three unknowns by elimination. */
function step(jacobian: readonly (readonly number[])[], f: readonly number[]): number[] | undefined {
  const n = f.length;
  const m = jacobian.map((row, i) => [...row, -(f[i] as number)]);
  for (let c = 0; c < n; c++) {
    let pivot = c;
    for (let r = c + 1; r < n; r++) if (Math.abs(m[r]?.[c] ?? 0) > Math.abs(m[pivot]?.[c] ?? 0)) pivot = r;
    const top = m[pivot] as number[];
    m[pivot] = m[c] as number[];
    m[c] = top;
    if (!(Math.abs(top[c] as number) > 1e-300)) return undefined;
    for (let r = 0; r < n; r++) {
      if (r === c) continue;
      const row = m[r] as number[];
      const factor = (row[c] as number) / (top[c] as number);
      for (let k = c; k <= n; k++) row[k] = (row[k] as number) - factor * (top[k] as number);
    }
  }
  return m.map((row, i) => (row[n] as number) / (row[i] as number));
}

/** What of the solvents stays free once the carbonyls have taken theirs. */
export function freeSolvents(contents: Contents, pH: number, options: SpeciateOptions): FreeSolvents {
  const start = compositionOf(contents.solvents, contents.temperatureK);
  const carbonyls = contents.carbonyls.reduce((sum, row) => sum + Math.max(0, row.amount || 0), 0);
  const volume = carbonylVolume(contents);
  const dilution = start.volumeL > 0 ? start.volumeL / (start.volumeL + volume) : 1;
  const nucleophiles = start.components.filter((component) => component.solvent.nucleophile !== "none");
  const solventMoles = nucleophiles.reduce((sum, component) => sum + component.amount, 0);
  if (nucleophiles.length === 0 || carbonyls <= NEGLIGIBLE * solventMoles)
    return { composition: start, dilution, converged: true };

  const keys = nucleophiles.map((component) => component.solvent.key);
  const totals = nucleophiles.map((component) => component.amount);
  const inert = start.components
    .filter((component) => component.solvent.nucleophile === "none")
    .map((component) => ({ solvent: component.solvent.key, amount: component.amount }));
  const compositionAt = (logs: readonly number[]): Composition =>
    compositionOf(
      [...inert, ...keys.map((key, i) => ({ solvent: key, amount: Math.exp(logs[i] as number) }))],
      contents.temperatureK,
    );
  // Relative balance of each solvent: (free + held)/total − 1.
  const balance = (logs: readonly number[]): number[] => {
    const bound = held(contents, compositionAt(logs), dilution, keys, pH, options);
    return logs.map((log, i) => (Math.exp(log) + (bound[i] as number)) / (totals[i] as number) - 1);
  };
  const size = (f: readonly number[]): number => Math.max(...f.map(Math.abs));

  let logs = totals.map((total) => Math.log(total * 0.5));
  let f = balance(logs);
  let steps = 0;
  for (; steps < MOST_STEPS && size(f) > TOLERANCE; steps++) {
    const h = 1e-6;
    const columns = logs.map((_, j) => balance(logs.map((log, i) => (i === j ? log + h : log))));
    const jacobian = logs.map((_, i) => logs.map((__, j) => ((columns[j]?.[i] ?? 0) - (f[i] as number)) / h));
    const direction = step(jacobian, f);
    if (!direction) break;
    // Halve the step until the balance improves; never above the total, never more than e² at once.
    let improved = false;
    for (let scale = 1; scale > 1e-4; scale /= 2) {
      const next = logs.map((log, i) =>
        Math.min(Math.log(totals[i] as number), log + Math.max(-2, Math.min(2, scale * (direction[i] as number)))),
      );
      const fNext = balance(next);
      if (size(fNext) < size(f)) {
        logs = next;
        f = fNext;
        improved = true;
        break;
      }
    }
    if (!improved) break;
  }
  return { composition: compositionAt(logs), dilution, converged: size(f) <= 1e-6 };
}
