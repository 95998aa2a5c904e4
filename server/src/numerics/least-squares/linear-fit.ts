import {
  applyQTransposed,
  columnNorms,
  dependentColumn,
  factorise,
  inverseGram,
  solveUpper,
} from '../linear-algebra/qr.js';

export interface LinearFit {
  readonly solution: Float64Array;
  /** (XᵀWX)⁻¹ */
  readonly unscaledCovariance: number[][];
}

/** A column is taken as dependent on those before it when less than this part of its length stands out of them. */
const DEPENDENT = 1e-9;

/**
 * Weighted linear least squares by QR of the whitened design.
 *
 * @param design  column-major rows×columns; overwritten
 * @param right   length rows; kept
 * @param weights length rows, ≥ 0: reciprocal variances
 * @returns the fit, or the index of the first parameter that the rows cannot tell from those before it
 */
export function fitLinear(
  design: Float64Array,
  right: Float64Array,
  weights: Float64Array,
): LinearFit | { readonly undeterminable: number } {
  const rows = right.length;
  const columns = design.length / rows;
  const response = new Float64Array(rows);
  for (let i = 0; i < rows; i++) {
    const root = Math.sqrt(weights[i]!);
    response[i] = root * right[i]!;
    for (let at = i; at < design.length; at += rows) design[at]! *= root;
  }
  const norms = columnNorms(design, rows, columns);
  const factors = factorise(design, rows, columns);
  const undeterminable = dependentColumn(factors, norms, DEPENDENT);
  if (undeterminable >= 0) return { undeterminable };
  applyQTransposed(factors, response);
  return { solution: solveUpper(factors, response), unscaledCovariance: inverseGram(factors) };
}
