/** The two operations on small dense matrices that the regression needs. */

export type Matrix = readonly (readonly number[])[];

/** Inverse of a positive definite matrix, by Gauss–Jordan elimination with pivoting. @throws Error for a singular one */
export function inverse(matrix: Matrix): number[][] {
  const n = matrix.length;
  const work = matrix.map((row, i) => [...row, ...row.map((_, j) => (i === j ? 1 : 0))]);
  for (let c = 0; c < n; c++) {
    let pivot = c;
    for (let r = c + 1; r < n; r++) if (Math.abs(work[r]?.[c] ?? 0) > Math.abs(work[pivot]?.[c] ?? 0)) pivot = r;
    [work[c], work[pivot]] = [work[pivot] as number[], work[c] as number[]];
    const top = work[c] as number[];
    const lead = top[c] as number;
    if (lead === 0) throw new Error("the normal matrix is singular: a term has neither data nor a prior");
    for (let k = 0; k < 2 * n; k++) top[k] = (top[k] as number) / lead;
    for (let r = 0; r < n; r++) {
      const row = work[r] as number[];
      const factor = row[c] as number;
      if (r === c || factor === 0) continue;
      for (let k = 0; k < 2 * n; k++) row[k] = (row[k] as number) - factor * (top[k] as number);
    }
  }
  return work.map((row) => row.slice(n));
}

/** Matrix times vector. */
export function times(matrix: Matrix, vector: readonly number[]): number[] {
  return matrix.map((row) => row.reduce((sum, value, i) => sum + value * (vector[i] as number), 0));
}
