/**
 * Fits the correlations for hydration constants on the table and writes shared-lib/equilibrium/constants/coefficients.json.
 * Ordinary least squares; leave-one-out residuals by the hat matrix. Run with `npm run fit`.
 */
import { writeFile } from "node:fs/promises";
import { createStructureToolkit } from "../shared-lib/compounds/structure.ts";
import { FAMILIES, type Family, familyOf, featuresOf } from "../shared-lib/equilibrium/constants/families.ts";
import { measuredCompounds } from "../shared-lib/equilibrium/constants/measured.ts";

const toolkit = createStructureToolkit();

interface Point {
  readonly smiles: string;
  readonly x: readonly number[];
  readonly y: number;
}

/** Solves A x = b by elimination with pivoting. */
function solve(a: number[][], b: number[]): number[] {
  const n = b.length;
  const m = a.map((row, i) => [...row, b[i] as number]);
  for (let c = 0; c < n; c++) {
    let pivot = c;
    for (let r = c + 1; r < n; r++) if (Math.abs(m[r]?.[c] ?? 0) > Math.abs(m[pivot]?.[c] ?? 0)) pivot = r;
    [m[c], m[pivot]] = [m[pivot] as number[], m[c] as number[]];
    const top = m[c] as number[];
    for (let r = 0; r < n; r++) {
      if (r === c) continue;
      const row = m[r] as number[];
      const factor = (row[c] as number) / (top[c] as number);
      for (let k = c; k <= n; k++) row[k] = (row[k] as number) - factor * (top[k] as number);
    }
  }
  return m.map((row, i) => (row[n] as number) / (row[i] as number));
}

function leastSquares(points: readonly Point[]) {
  const p = points[0]?.x.length ?? 0;
  const normal = Array.from({ length: p }, (_, i) =>
    Array.from({ length: p }, (_, j) => points.reduce((s, q) => s + (q.x[i] ?? 0) * (q.x[j] ?? 0), 0)),
  );
  const right = Array.from({ length: p }, (_, i) => points.reduce((s, q) => s + (q.x[i] ?? 0) * q.y, 0));
  const beta = solve(normal, right);
  const residuals = points.map((q) => q.y - q.x.reduce((s, x, i) => s + x * (beta[i] ?? 0), 0));
  const looResiduals = points.map((q, k) => {
    const w = solve(normal, [...q.x]);
    const leverage = q.x.reduce((s, x, i) => s + x * (w[i] ?? 0), 0);
    return (residuals[k] as number) / (1 - leverage);
  });
  const rms = (values: number[]): number => Math.sqrt(values.reduce((s, v) => s + v * v, 0) / values.length);
  return { beta, rmse: rms(residuals), looRmse: rms(looResiduals), looResiduals };
}

const pools = new Map<Family, Point[]>();
for (const { smiles, log10 } of measuredCompounds("neutral")) {
  const reading = toolkit.read(smiles);
  if (!reading.ok || !reading.carbonyl) continue;

  // Of unlike sites the constant in the table is that of the aldehyde, which takes the water first.
  const site = [...reading.carbonyl.sites].sort((a, b) => b.hydrogens - a.hydrogens || b.acyl - a.acyl)[0];
  if (!site) continue;
  const equivalentSites = reading.carbonyl.sites.filter(
    (other) => other.hydrogens === site.hydrogens && other.acyl === site.acyl,
  ).length;
  const family = familyOf(site);
  if (!family || !FAMILIES[family].fitted) continue;
  // The published constant counts every equivalent C=O; the correlation speaks of one.
  const pool = pools.get(family) ?? [];
  pool.push({
    smiles,
    x: featuresOf(family, site),
    y: log10 - (equivalentSites > 1 ? Math.log10(equivalentSites) : 0),
  });
  pools.set(family, pool);
}
const result: Record<string, object> = {};
for (const [family, points] of [...pools].sort()) {
  const fit = leastSquares(points);
  const round = (v: number): number => Number(v.toFixed(3));
  result[family] = { beta: fit.beta.map(round), n: points.length, rmse: round(fit.rmse), looRmse: round(fit.looRmse) };
  console.log(family, result[family]);
  points.forEach((q, k) => {
    if (Math.abs(fit.looResiduals[k] as number) > 0.4)
      console.log("   ", q.smiles, "leave-one-out residual", round(fit.looResiduals[k] as number));
  });
}
await writeFile(
  new URL("../shared-lib/equilibrium/constants/coefficients.json", import.meta.url),
  `${JSON.stringify(result, undefined, 2)}\n`,
);
