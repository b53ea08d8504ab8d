/** The accuracy of the hydration correlation as tables in Markdown; the methods page holds the same text. */

import { createStructureToolkit } from "../../shared-lib/compounds/structure.ts";
import coefficients from "../../shared-lib/equilibrium/constants/coefficients.json" with { type: "json" };
import { correlate, inChargeState } from "../../shared-lib/equilibrium/constants/correlate.ts";
import { measuredLimits } from "../../shared-lib/equilibrium/constants/measured.ts";
import type { ChargeState } from "../../shared-lib/equilibrium/constants/types.ts";
import { calibrated } from "../fit.mts";
import { fitPoints, type Point } from "./points.mts";

const NORMAL_975 = 1.96;

interface Row {
  readonly group: string;
  readonly residual: number;
  readonly loo: number;
  readonly inside: boolean;
}

function rowsOf(points: readonly Point[]): Row[] {
  const { solution } = calibrated(points);
  return points.map((point, k) => {
    const { residual, variance } = solution.loo[k] as { residual: number; variance: number };
    const { factor } = coefficients.families[point.family];
    return {
      group: point.siteClass,
      residual: solution.residuals[k] as number,
      loo: residual,
      inside: Math.abs(residual) <= NORMAL_975 * factor * Math.sqrt(variance),
    };
  });
}

const rms = (values: readonly number[]): number => Math.sqrt(values.reduce((s, v) => s + v * v, 0) / values.length);

function line(name: string, rows: readonly Row[]): string {
  const bias = rows.reduce((sum, row) => sum + row.loo, 0) / rows.length;
  const inside = rows.filter((row) => row.inside).length;
  const cells = [
    name,
    String(rows.length),
    signed(bias),
    rms(rows.map((row) => row.residual)).toFixed(2),
    rms(rows.map((row) => row.loo)).toFixed(2),
    `${inside} of ${rows.length} (${((100 * inside) / rows.length).toFixed(0)} %)`,
  ];
  return `| ${cells.join(" | ")} |`;
}

function byClass(points: readonly Point[]): string[] {
  const rows = rowsOf(points);
  const groups = [...new Set(rows.map((row) => row.group))].sort();
  return [
    "| class | n | bias | RMSE | leave-one-out RMSE | inside the leave-one-out 95 % interval |",
    "| --- | --- | --- | --- | --- | --- |",
    ...groups.map((group) =>
      line(
        group,
        rows.filter((row) => row.group === group),
      ),
    ),
    line("**all**", rows),
  ];
}

interface Prediction {
  readonly smiles: string;
  readonly log10: number;
  readonly sd: number;
  /** Like sites, which a bound published for the compound counts all. */
  readonly sites: number;
}

const signed = (value: number): string => value.toFixed(2).replace("-", "−");

const toolkit = createStructureToolkit();

function predicted(smiles: string, state: ChargeState): Prediction | undefined {
  const reading = toolkit.read(smiles);
  const like = reading.ok ? (reading.carbonyl?.sites.filter((site) => site.leading) ?? []) : [];
  const site = like[0];
  if (!site || (state !== "neutral" && inChargeState(site, state) === site)) return undefined;
  const found = correlate(site, state);
  return "outside" in found ? undefined : { smiles, log10: found.log10, sd: found.sd, sites: like.length };
}

function external(points: readonly Point[]): string[] {
  const rows = points.flatMap((point) => {
    const found = predicted(point.smiles, point.state);
    return found ? [{ ...point, ...found, inside: Math.abs(found.log10 - point.y) <= NORMAL_975 * found.sd }] : [];
  });
  const inside = rows.filter((row) => row.inside).length;
  const cells = rows.map(
    ({ smiles, y, log10, sd }) =>
      `| \`${smiles}\` | ${signed(y)} | ${signed(log10)} (${signed(log10 - NORMAL_975 * sd)} to ${signed(log10 + NORMAL_975 * sd)}) |`,
  );
  return [
    "| compound | log K measured | log K correlated (95 %) |",
    "| --- | --- | --- |",
    ...cells,
    "",
    `RMSE ${rms(rows.map((row) => row.log10 - row.y)).toFixed(2)} over ${rows.length} compounds; ${inside} of ${rows.length} inside the 95 % interval.`,
  ];
}

function limits(): string[] {
  const states: readonly ChargeState[] = ["neutral", "anion", "cation"];
  const rows = states.flatMap((state) =>
    measuredLimits(state).flatMap(({ smiles, value }) => {
      const found = predicted(smiles, state);
      if (!found) return [];
      const whole = found.log10 + Math.log10(found.sites);
      const beyond = value.limit === "<" ? whole - value.log10 : value.log10 - whole;
      return [{ smiles, beyond, sd: found.sd }];
    }),
  );
  const agree = rows.filter((row) => row.beyond <= 0).length;
  const within = rows.filter((row) => row.beyond > 0 && row.beyond <= NORMAL_975 * row.sd).length;
  const against = rows.filter((row) => row.beyond > NORMAL_975 * row.sd).map((row) => `\`${row.smiles}\``);
  return [
    `Of ${rows.length} published or commonly known bounds (hydrated to less or more than can be measured) ${agree} hold for the correlated value, ${within} more within its error${against.length > 0 ? `; against the bound: ${against.join(", ")}` : ""}.`,
  ];
}

/** The whole report. */
export function accuracyReport(): string {
  const points = fitPoints();
  return [
    ...byClass(points.filter((point) => !point.external)),
    "",
    "Constants that the regression never saw (the bounds were widened with these in sight, so this is no blind check):",
    "",
    ...external(points.filter((point) => point.external)),
    "",
    ...limits(),
  ].join("\n");
}
