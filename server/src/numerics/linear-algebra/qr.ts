/**
 * Householder QR of small dense problems: many rows, a handful of columns.
 *
 * Matrices are column-major `Float64Array`s, so that a column is one run of memory; a general matrix class costs more
 * than the arithmetic at the sizes met here. Method: G. H. Golub, C. F. Van Loan, *Matrix Computations*, 4th ed.,
 * Johns Hopkins 2013, §5.2.2.
 */
export interface QrFactors {
  readonly rows: number;
  readonly columns: number;
  /** Column-major rows×columns: the Householder vectors on and below the diagonal, R above it. */
  readonly vectors: Float64Array;
  /** Length columns: the diagonal of R. */
  readonly diagonal: Float64Array;
}

/**
 * Factorises `matrix` in place: it becomes `vectors` of the result.
 *
 * @param matrix column-major rows×columns, rows ≥ columns; overwritten
 */
export function factorise(matrix: Float64Array, rows: number, columns: number): QrFactors {
  const diagonal = new Float64Array(columns);
  for (let k = 0; k < columns; k++) {
    const start = k * rows;
    const norm = columnNorm(matrix, start + k, start + rows);
    if (norm === 0) continue;
    const pivot = matrix[start + k]! < 0 ? -norm : norm;
    for (let i = start + k; i < start + rows; i++) matrix[i]! /= pivot;
    matrix[start + k]! += 1;
    for (let j = k + 1; j < columns; j++) reflect(matrix, start, k, rows, matrix, j * rows);
    diagonal[k] = -pivot;
  }
  return { rows, columns, vectors: matrix, diagonal };
}

/** Replaces `vector`, length rows, by Qᵀ vector. */
export function applyQTransposed(factors: QrFactors, vector: Float64Array): void {
  const { rows, columns, vectors } = factors;
  for (let k = 0; k < columns; k++) {
    if (factors.diagonal[k] !== 0) reflect(vectors, k * rows, k, rows, vector, 0);
  }
}

/** Replaces `vector`, length rows, by Q vector. */
export function applyQ(factors: QrFactors, vector: Float64Array): void {
  const { rows, columns, vectors } = factors;
  for (let k = columns - 1; k >= 0; k--) {
    if (factors.diagonal[k] !== 0) reflect(vectors, k * rows, k, rows, vector, 0);
  }
}

/** Solves R x = right for the first `columns` elements of `right`; the result has length columns. */
export function solveUpper(factors: QrFactors, right: Float64Array): Float64Array {
  const { rows, columns, vectors, diagonal } = factors;
  const solution = right.slice(0, columns);
  for (let k = columns - 1; k >= 0; k--) {
    solution[k]! /= diagonal[k]!;
    for (let i = 0; i < k; i++) solution[i]! -= solution[k]! * vectors[k * rows + i]!;
  }
  return solution;
}

/** (AᵀA)⁻¹ = R⁻¹R⁻ᵀ of the factorised matrix A, as rows of numbers; from R, never from AᵀA. */
export function inverseGram(factors: QrFactors): number[][] {
  const { columns } = factors;
  const inverse = Array.from({ length: columns }, (_, k) => {
    const unit = new Float64Array(columns);
    unit[k] = 1;
    return solveUpper(factors, unit);
  });
  return Array.from({ length: columns }, (_, i) =>
    Array.from({ length: columns }, (_, j) => inverse.reduce((sum, column) => sum + column[i]! * column[j]!, 0)),
  );
}

/** Index of the first column that depends linearly on the columns before it, or −1. `norms` are the columns' lengths. */
export function dependentColumn(factors: QrFactors, norms: ArrayLike<number>, tolerance: number): number {
  for (let k = 0; k < factors.columns; k++) {
    if (!(Math.abs(factors.diagonal[k]!) > tolerance * norms[k]!)) return k;
  }
  return -1;
}

/** Euclidean lengths of the columns of a column-major rows×columns matrix. */
export function columnNorms(matrix: Float64Array, rows: number, columns: number): Float64Array {
  const norms = new Float64Array(columns);
  for (let k = 0; k < columns; k++) norms[k] = columnNorm(matrix, k * rows, (k + 1) * rows);
  return norms;
}

/** √Σ x² without overflow or underflow of the squares. */
function columnNorm(values: Float64Array, from: number, to: number): number {
  let largest = 0;
  for (let i = from; i < to; i++) {
    const size = Math.abs(values[i]!);
    if (!(size <= largest)) largest = size;
  }
  if (!(largest > 0)) return largest;
  let sum = 0;
  for (let i = from; i < to; i++) {
    const scaled = values[i]! / largest;
    sum += scaled * scaled;
  }
  return largest * Math.sqrt(sum);
}

/** Applies the k-th reflection, stored in column `from` of `vectors`, to the column of `target` that begins at `to`. */
function reflect(vectors: Float64Array, from: number, k: number, rows: number, target: Float64Array, to: number): void {
  let product = 0;
  for (let i = k; i < rows; i++) product += vectors[from + i]! * target[to + i]!;
  product = -product / vectors[from + k]!;
  for (let i = k; i < rows; i++) target[to + i]! += product * vectors[from + i]!;
}
