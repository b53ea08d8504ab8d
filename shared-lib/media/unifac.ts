/**
 * Activity coefficients by modified UNIFAC (Dortmund): Weidlich, Gmehling, Ind. Eng. Chem. Res. 1987, 26, 1372; parameters as published up to
 * Constantinescu, Gmehling, J. Chem. Eng. Data 2016, 61, 2738. A mixture with a pair that was never published is computed wholly with the
 * predicted table of modified UNIFAC 2.0 (Hayer, Hasse, Jirasek 2024). unifac-pairs.tsv names the few pairs that are our own fits.
 */

import { unifacText } from "../generated/unifac-text.ts";

type Triple = readonly number[];
interface UnifacData {
  /** Subgroup → [main group, R, Q]. */
  readonly subgroups: Readonly<Record<string, readonly [number, number, number]>>;
  /** Solvent → subgroup → count. */
  readonly solvents: Readonly<Record<string, Readonly<Record<string, number>>>>;
  readonly pairs: Readonly<Record<string, Triple>>;
  readonly predicted: Readonly<Record<string, Triple>>;
}

let decoded: UnifacData | undefined;
function tables(): UnifacData {
  decoded ??= JSON.parse(unifacText) as UnifacData;
  return decoded;
}

/** True when the model has groups for a solvent of the table. */
export function hasGroups(solvent: string): boolean {
  return tables().solvents[solvent] !== undefined;
}

/** All of a mixture that does not depend on its composition, at one temperature. */
export interface UnifacMixture {
  readonly size: number;
  readonly groupCount: number;
  /** Main group of every group. */
  readonly mains: readonly number[];
  /** Count of group k in component i at [i × groupCount + k]. */
  readonly counts: Float64Array;
  readonly groupArea: Float64Array;
  /** ψ(m, k) at [m × groupCount + k]. */
  readonly psi: Float64Array;
  readonly r: Float64Array;
  readonly rPower: Float64Array;
  readonly q: Float64Array;
  /** Σ over the groups of a component of count × ln Γ in the pure liquid. */
  readonly pure: Float64Array;
  /** Some pair of groups was never published: its parameters are predicted. */
  readonly predicted: boolean;
  /** Room for intermediate results, so that a calculation allocates nothing but its answer. */
  readonly work: Work;
}

interface Work {
  readonly mixed: Float64Array;
  readonly theta: Float64Array;
  readonly share: Float64Array;
  readonly lnGamma: Float64Array;
}

function workFor(groups: number): Work {
  return {
    mixed: new Float64Array(groups),
    theta: new Float64Array(groups),
    share: new Float64Array(groups),
    lnGamma: new Float64Array(groups),
  };
}

function interactions(mains: readonly number[], temperatureK: number): { psi: Float64Array; predicted: boolean } {
  const { pairs, predicted } = tables();
  const published = mains.every((m) => mains.every((n) => m === n || pairs[`${m}-${n}`] !== undefined));
  const table = published ? pairs : predicted;
  const psi = new Float64Array(mains.length ** 2).fill(1);
  mains.forEach((m, i) => {
    mains.forEach((n, k) => {
      const pair = table[`${m}-${n}`];
      if (m === n || !pair) return;
      const [a = 0, b = 0, c = 0] = pair;
      psi[i * mains.length + k] = Math.exp(-(a / temperatureK + b + c * temperatureK));
    });
  });
  return { psi, predicted: !published };
}

/** ln Γ of every group for `counts` of groups (any unit); the answer is `work.lnGamma`, valid until the next call. */
function groupActivities(counts: Float64Array, area: Float64Array, psi: Float64Array, work: Work): Float64Array {
  const n = area.length;
  const { theta, share, lnGamma } = work;
  let total = 0;
  for (let k = 0; k < n; k++) {
    theta[k] = (counts[k] as number) * (area[k] as number);
    total += theta[k] as number;
  }
  for (let k = 0; k < n; k++) {
    let sum = 0;
    for (let m = 0; m < n; m++) sum += (theta[m] as number) * (psi[m * n + k] as number);
    share[k] = (theta[k] as number) / sum;
    lnGamma[k] = 1 - Math.log(sum / total);
  }
  for (let k = 0; k < n; k++) {
    let ratio = 0;
    for (let m = 0; m < n; m++) ratio += (share[m] as number) * (psi[k * n + m] as number);
    lnGamma[k] = (area[k] as number) * ((lnGamma[k] as number) - ratio);
  }
  return lnGamma;
}

/**
 * Prepares a mixture.
 *
 * @param solvents keys of the solvents table, each with groups (see `hasGroups`)
 */
export function prepareUnifac(solvents: readonly string[], temperatureK: number): UnifacMixture {
  const { subgroups, solvents: makeup } = tables();
  const own = solvents.map((solvent) => makeup[solvent] ?? {});
  const ids = [...new Set(own.flatMap((groups) => Object.keys(groups)))];
  const rows = ids.map((id) => subgroups[id] ?? ([0, 0, 0] as const));
  const mains = rows.map(([main]) => main);
  const { psi, predicted } = interactions(mains, temperatureK);
  const n = ids.length;
  const counts = new Float64Array(solvents.length * n);
  own.forEach((groups, i) => {
    ids.forEach((id, k) => {
      counts[i * n + k] = groups[id] ?? 0;
    });
  });
  const groupArea = Float64Array.from(rows, ([, , Q]) => Q);
  const total = (column: 1 | 2): Float64Array =>
    Float64Array.from(own, (_, i) =>
      rows.reduce((sum, row, k) => sum + (counts[i * n + k] as number) * row[column], 0),
    );
  const r = total(1);
  const work = workFor(n);
  const pure = Float64Array.from(own, (_, i) => {
    const mine = counts.subarray(i * n, (i + 1) * n);
    const lnGamma = groupActivities(mine, groupArea, psi, work);
    return mine.reduce((sum, count, k) => (count === 0 ? sum : sum + count * (lnGamma[k] as number)), 0);
  });
  return {
    size: solvents.length,
    groupCount: n,
    mains,
    counts,
    groupArea,
    psi,
    r,
    rPower: r.map((value) => value ** 0.75),
    q: total(2),
    pure,
    predicted,
    work,
  };
}

/** ln γ of every component (pure liquid = 0) at mole fractions `x`, adding up to 1. */
export function lnGammas(mixture: UnifacMixture, x: ArrayLike<number>): Float64Array {
  const { size, groupCount: n, counts, r, q, rPower } = mixture;
  const { mixed } = mixture.work;
  mixed.fill(0);
  let rMean = 0;
  let qMean = 0;
  let rPowerMean = 0;
  for (let i = 0; i < size; i++) {
    const xi = x[i] as number;
    rMean += xi * (r[i] as number);
    qMean += xi * (q[i] as number);
    rPowerMean += xi * (rPower[i] as number);
    for (let k = 0; k < n; k++) mixed[k] = (mixed[k] as number) + xi * (counts[i * n + k] as number);
  }
  const group = groupActivities(mixed, mixture.groupArea, mixture.psi, mixture.work);
  const result = new Float64Array(size);
  for (let i = 0; i < size; i++) {
    const v = (r[i] as number) / rMean;
    const vOverF = v / ((q[i] as number) / qMean);
    const vPower = (rPower[i] as number) / rPowerMean;
    let residual = -(mixture.pure[i] as number);
    for (let k = 0; k < n; k++) {
      const count = counts[i * n + k] as number;
      if (count > 0) residual += count * (group[k] as number);
    }
    result[i] = 1 - vPower + Math.log(vPower) - 5 * (q[i] as number) * (1 - vOverF + Math.log(vOverF)) + residual;
  }
  return result;
}
