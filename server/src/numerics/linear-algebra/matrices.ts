/** Small matrices as rows of numbers: the form in which covariances are published. */

export function zeros(size: number): number[][] {
  return Array.from({ length: size }, () => new Array<number>(size).fill(0));
}

export function scaled(matrix: readonly (readonly number[])[], factor: number): number[][] {
  return matrix.map((row) => row.map((value) => value * factor));
}

export function plus(a: readonly (readonly number[])[], b: readonly (readonly number[])[]): number[][] {
  return a.map((row, i) => row.map((value, j) => value + b[i]![j]!));
}

/** J C Jᵀ, exactly symmetric; `jacobian` is m×n, `covariance` n×n. */
export function propagated(
  jacobian: readonly (readonly number[])[],
  covariance: readonly (readonly number[])[],
): number[][] {
  const half = jacobian.map((row) => covariance.map((column) => dot(row, column)));
  const full = half.map((row) => jacobian.map((other) => dot(row, other)));
  return full.map((row, i) => row.map((value, j) => (i <= j ? value : full[j]![i]!)));
}

/** gᵀ C g */
export function quadraticForm(covariance: readonly (readonly number[])[], gradient: ArrayLike<number>): number {
  let sum = 0;
  for (let i = 0; i < covariance.length; i++) {
    for (let j = 0; j < covariance.length; j++) sum += covariance[i]![j]! * gradient[i]! * gradient[j]!;
  }
  return sum;
}

/** Correlation coefficients of a covariance matrix. */
export function correlationsOf(covariance: readonly (readonly number[])[]): number[][] {
  return covariance.map((row, i) =>
    row.map((value, j) => (i === j ? 1 : value / Math.sqrt(covariance[i]![i]! * covariance[j]![j]!))),
  );
}

function dot(a: readonly number[], b: readonly number[]): number {
  return a.reduce((sum, value, i) => sum + value * b[i]!, 0);
}
