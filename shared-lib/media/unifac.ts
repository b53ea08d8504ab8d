/**
 * Activity coefficients by modified UNIFAC (Dortmund): Weidlich, Gmehling, Ind. Eng. Chem. Res. 1987, 26, 1372; parameters as published up to
 * Constantinescu, Gmehling, J. Chem. Eng. Data 2016, 61, 2738; pairs never published from modified UNIFAC 2.0 (Hayer, Hasse, Jirasek 2024).
 */

import data from "../generated/unifac.json" with { type: "json" };

interface Subgroup {
  readonly main: number;
  readonly R: number;
  readonly Q: number;
}
type Triple = readonly [number, number, number];
interface UnifacData {
  readonly subgroups: Readonly<Record<string, Subgroup>>;
  readonly solvents: Readonly<Record<string, Readonly<Record<string, number>>>>;
  readonly pairs: Readonly<Record<string, Triple>>;
  readonly filled: Readonly<Record<string, Triple>>;
}
const DATA = data as unknown as UnifacData;

export interface UnifacResult {
  /** ln γ in the order of the components. */
  readonly lnGamma: readonly number[];
  /** Some pair of groups was never published: its parameters are predicted. */
  readonly predicted: boolean;
}

/** True when the model has groups for a solvent of the table. */
export function hasGroups(solvent: string): boolean {
  return DATA.solvents[solvent] !== undefined;
}

/** ψ of every pair of groups at a temperature; one table for the whole mixture, never pair by pair. */
function interactions(groups: readonly Subgroup[], temperatureK: number): { psi: number[][]; predicted: boolean } {
  const key = (m: Subgroup, n: Subgroup): string => `${m.main}-${n.main}`;
  const published = groups.every((m) => groups.every((n) => m.main === n.main || DATA.pairs[key(m, n)] !== undefined));
  const table = published ? DATA.pairs : DATA.filled;
  const psi = groups.map((m) =>
    groups.map((n) => {
      if (m.main === n.main) return 1;
      const [a, b, c] = table[key(m, n)] ?? [0, 0, 0];
      return Math.exp(-(a / temperatureK + b + c * temperatureK));
    }),
  );
  return { psi, predicted: !published };
}

/** ln Γ of every group in a mixture of groups, `counts` in any unit. */
function groupActivities(
  counts: readonly number[],
  groups: readonly Subgroup[],
  psi: readonly (readonly number[])[],
): number[] {
  let area = 0;
  for (let k = 0; k < groups.length; k++) area += (counts[k] as number) * (groups[k] as Subgroup).Q;
  const theta = groups.map((group, k) => ((counts[k] as number) * group.Q) / area);
  const denominators = groups.map((_, k) =>
    theta.reduce((sum, t, m) => sum + t * ((psi[m] as number[])[k] as number), 0),
  );
  return groups.map((group, k) => {
    let ratio = 0;
    for (let m = 0; m < groups.length; m++)
      ratio += ((theta[m] as number) * ((psi[k] as number[])[m] as number)) / (denominators[m] as number);
    return group.Q * (1 - Math.log(denominators[k] as number) - ratio);
  });
}

/**
 * Activity coefficients (pure liquid = 1) of a mixture.
 *
 * @param solvents keys of the solvents table, each with groups (see `hasGroups`)
 * @param x mole fractions, adding up to 1
 */
export function unifac(solvents: readonly string[], x: readonly number[], temperatureK: number): UnifacResult {
  const makeup = solvents.map((solvent) => DATA.solvents[solvent] ?? {});
  const ids = [...new Set(makeup.flatMap((groups) => Object.keys(groups)))];
  const groups = ids.map((id) => DATA.subgroups[id] as Subgroup);
  const counts = makeup.map((own) => ids.map((id) => own[id] ?? 0));
  const { psi, predicted } = interactions(groups, temperatureK);
  const size = (pick: (group: Subgroup) => number): number[] =>
    counts.map((own) => own.reduce((sum, n, k) => sum + n * pick(groups[k] as Subgroup), 0));
  const r = size((group) => group.R);
  const q = size((group) => group.Q);
  const mean = (values: readonly number[]): number =>
    values.reduce((sum, value, i) => sum + value * (x[i] as number), 0);
  const rMean = mean(r);
  const qMean = mean(q);
  const rPower = r.map((value) => value ** 0.75);
  const rPowerMean = mean(rPower);
  const mixed = groupActivities(
    ids.map((_, k) => counts.reduce((sum, own, i) => sum + (own[k] as number) * (x[i] as number), 0)),
    groups,
    psi,
  );
  const lnGamma = counts.map((own, i) => {
    const pure = groupActivities(own, groups, psi);
    const v = (r[i] as number) / rMean;
    const f = (q[i] as number) / qMean;
    const vPower = (rPower[i] as number) / rPowerMean;
    const combinatorial = 1 - vPower + Math.log(vPower) - 5 * (q[i] as number) * (1 - v / f + Math.log(v / f));
    const residual = own.reduce(
      (sum, n, k) => (n === 0 ? sum : sum + n * ((mixed[k] as number) - (pure[k] as number))),
      0,
    );
    return combinatorial + residual;
  });
  return { lnGamma, predicted };
}
