/** Symmetric positive definite systems of a few unknowns, by Cholesky factors; row-major arrays, no allocation inside. */

/**
 * Factors the n × n matrix in place (lower triangle).
 *
 * @returns false when it is not positive definite in double precision
 */
export function factorCholesky(matrix: Float64Array, n: number): boolean {
  for (let i = 0; i < n; i++) {
    for (let j = 0; j <= i; j++) {
      let sum = matrix[i * n + j] as number;
      for (let k = 0; k < j; k++) sum -= (matrix[i * n + k] as number) * (matrix[j * n + k] as number);
      if (i !== j) matrix[i * n + j] = sum / (matrix[j * n + j] as number);
      else if (sum > 0) matrix[i * n + i] = Math.sqrt(sum);
      else return false;
    }
  }
  return true;
}

/** Solves L·Lᵀ·x = b in place, with the factor of `factorCholesky`. */
export function solveCholesky(factor: Float64Array, n: number, b: Float64Array): void {
  for (let i = 0; i < n; i++) {
    let sum = b[i] as number;
    for (let k = 0; k < i; k++) sum -= (factor[i * n + k] as number) * (b[k] as number);
    b[i] = sum / (factor[i * n + i] as number);
  }
  for (let i = n - 1; i >= 0; i--) {
    let sum = b[i] as number;
    for (let k = i + 1; k < n; k++) sum -= (factor[k * n + i] as number) * (b[k] as number);
    b[i] = sum / (factor[i * n + i] as number);
  }
}
