/**
 * Fits the correlation for hydration constants on the table (Bayesian linear regression from the priors of terms.ts) and writes
 * shared-lib/equilibrium/constants/coefficients.json. The scatter of each family is set so that its leave-one-out residuals, each
 * over its own predicted error, have unit mean square. Run with `npm run fit`.
 */
import { writeFile } from "node:fs/promises";
import { type Family, TERMS } from "../shared-lib/equilibrium/constants/terms.ts";
import { inverse, type Matrix, times } from "./fit/matrix.mts";
import { fitPoints, type Point } from "./fit/points.mts";
import { residualPlot } from "./fit/residual-plot.mts";

const ROUNDS = 40;
const LEAST_SCATTER = 0.08;

interface Solution {
  readonly beta: readonly number[];
  readonly covariance: Matrix;
  /** Leave-one-out residual and its predicted variance, by point. */
  readonly loo: readonly { readonly residual: number; readonly variance: number }[];
  readonly residuals: readonly number[];
}

function noiseOf(point: Point, scatter: ReadonlyMap<Family, number>): number {
  return (scatter.get(point.family) as number) ** 2 + point.variance;
}

/** One regression at given scatters; leave-one-out by the leverage, which is exact for it. */
export function regress(points: readonly Point[], scatter: ReadonlyMap<Family, number>): Solution {
  const size = TERMS.length;
  const normal: number[][] = TERMS.map((term, i) => TERMS.map((_, j) => (i === j ? 1 / term.prior.sd ** 2 : 0)));
  const right = TERMS.map((term) => term.prior.mean / term.prior.sd ** 2);
  for (const point of points) {
    const weight = 1 / noiseOf(point, scatter);
    for (let i = 0; i < size; i++) {
      const xi = point.x[i] as number;
      if (xi === 0) continue;
      right[i] = (right[i] as number) + weight * xi * point.y;
      for (let j = 0; j < size; j++) {
        const row = normal[i] as number[];
        row[j] = (row[j] as number) + weight * xi * (point.x[j] as number);
      }
    }
  }
  const covariance = inverse(normal);
  const beta = times(covariance, right);
  const predicted = (x: readonly number[]): number => x.reduce((sum, value, i) => sum + value * (beta[i] as number), 0);
  const residuals = points.map((point) => point.y - predicted(point.x));
  const loo = points.map((point, k) => {
    const noise = noiseOf(point, scatter);
    const own = times(covariance, point.x).reduce((sum, value, i) => sum + value * (point.x[i] as number), 0);
    const leverage = own / noise;
    return { residual: (residuals[k] as number) / (1 - leverage), variance: noise / (1 - leverage) };
  });
  return { beta, covariance, loo, residuals };
}

/** Repeats the regression until the scatter of each family agrees with its leave-one-out residuals. */
export function calibrated(points: readonly Point[]): { solution: Solution; scatter: ReadonlyMap<Family, number> } {
  const families = [...new Set(points.map((point) => point.family))];
  let scatter = new Map<Family, number>(families.map((family) => [family, 0.25]));
  let solution = regress(points, scatter);
  for (let round = 0; round < ROUNDS; round++) {
    const next = new Map<Family, number>();
    for (const family of families) {
      const own = points.flatMap((point, k) => (point.family === family ? [k] : []));
      const square = own.reduce((sum, k) => {
        const { residual, variance } = solution.loo[k] as Solution["loo"][number];
        return sum + residual ** 2 / variance;
      }, 0);
      const old = scatter.get(family) as number;
      next.set(family, Math.max(LEAST_SCATTER, old * (square / own.length) ** 0.3));
    }
    scatter = next;
    solution = regress(points, scatter);
  }
  return { solution, scatter };
}

const rms = (values: readonly number[]): number => Math.sqrt(values.reduce((s, v) => s + v * v, 0) / values.length);
const round = (value: number, digits = 4): number => Number(value.toFixed(digits));

/** Student's t at 97.5 % over the normal's 1.96, by an expansion good to 1 % from 4 degrees of freedom. */
function studentFactor(freedom: number): number {
  const v = Math.max(freedom, 4);
  return 1 + 1.21 / v + 1.4 / v ** 2;
}

function summary(points: readonly Point[], { solution, scatter }: ReturnType<typeof calibrated>) {
  const families = [...scatter.keys()].sort();
  return Object.fromEntries(
    families.map((family) => {
      const own = points.flatMap((point, k) => (point.family === family ? [k] : []));
      return [
        family,
        {
          n: own.length,
          rmse: round(rms(own.map((k) => solution.residuals[k] as number)), 3),
          looRmse: round(rms(own.map((k) => (solution.loo[k] as { residual: number }).residual)), 3),
          scatter: round(scatter.get(family) as number),
          factor: round(studentFactor(own.length - 3), 3),
        },
      ];
    }),
  );
}

async function main(): Promise<void> {
  const points = fitPoints().filter((point) => !point.external);
  const fit = calibrated(points);
  const result = {
    terms: TERMS.map((term) => term.name),
    beta: fit.solution.beta.map((value) => round(value)),
    covariance: fit.solution.covariance.map((row) => row.map((value) => round(value, 6))),
    families: summary(points, fit),
  };
  TERMS.forEach((term, i) => {
    const sd = Math.sqrt(fit.solution.covariance[i]?.[i] ?? 0);
    console.log(
      `${term.name.padEnd(42)} ${(result.beta[i] as number).toFixed(2).padStart(6)} ± ${sd.toFixed(2)}   prior ${term.prior.mean} ± ${term.prior.sd}`,
    );
  });
  for (const [family, row] of Object.entries(result.families)) console.log(family.padEnd(16), JSON.stringify(row));
  points.forEach((point, k) => {
    const { residual, variance } = fit.solution.loo[k] as Solution["loo"][number];
    if (Math.abs(residual) > 2 * Math.sqrt(variance) || Math.abs(residual) > 0.5)
      console.log(
        `  ${point.smiles} ${point.state} (${point.family}) leave-one-out residual ${residual.toFixed(2)}, ${(residual / Math.sqrt(variance)).toFixed(1)} sd`,
      );
  });
  const target = new URL("../shared-lib/equilibrium/constants/", import.meta.url);
  await writeFile(new URL("coefficients.json", target), `${JSON.stringify(result, undefined, 1)}\n`);
  await writeFile(
    new URL("residuals.svg", target),
    residualPlot(
      points.map((point, k) => ({
        family: point.family,
        x: point.y,
        residual: (fit.solution.loo[k] as { residual: number }).residual,
      })),
    ),
  );
}

if (process.argv[1]?.endsWith("fit.mts")) await main();
