/** A symmetric 2×2 matrix [[intercept, covariance], [covariance, slope]]. */
export interface Symmetric2 {
  readonly intercept: number;
  readonly covariance: number;
  readonly slope: number;
}

/**
 * Inverse and ln determinant of a small symmetric positive-definite matrix, by Cholesky; NaN where it is not positive
 * definite. Only the lower triangle is read.
 */
export function inverseAndLogDeterminant(matrix: readonly (readonly number[])[]): {
  inverse: number[][];
  lnDeterminant: number;
} {
  const size = matrix.length;
  const lower = matrix.map((row) => row.slice());
  let lnDeterminant = 0;
  for (let k = 0; k < size; k++) {
    for (let j = 0; j <= k; j++) {
      let value = matrix[k]![j]!;
      for (let i = 0; i < j; i++) value -= lower[k]![i]! * lower[j]![i]!;
      lower[k]![j] = j < k ? value / lower[j]![j]! : Math.sqrt(value);
    }
    lnDeterminant += 2 * Math.log(lower[k]![k]!);
  }
  return { inverse: inverseFrom(lower), lnDeterminant };
}

/** (L Lᵀ)⁻¹ */
function inverseFrom(lower: readonly (readonly number[])[]): number[][] {
  const size = lower.length;
  const inverseLower = lower.map((row) => row.map(() => 0));
  for (let column = 0; column < size; column++) {
    for (let i = column; i < size; i++) {
      let value = i === column ? 1 : 0;
      for (let k = column; k < i; k++) value -= lower[i]![k]! * inverseLower[k]![column]!;
      inverseLower[i]![column] = value / lower[i]![i]!;
    }
  }
  return lower.map((_, i) =>
    lower.map((__, j) => {
      let value = 0;
      for (let k = Math.max(i, j); k < size; k++) value += inverseLower[k]![i]! * inverseLower[k]![j]!;
      return value;
    }),
  );
}
