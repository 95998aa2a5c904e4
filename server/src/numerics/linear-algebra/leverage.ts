import { quadraticForm } from './matrices.js';

/**
 * Leverages (hat values) of the rows of a weighted design: w xᵀ (XᵀWX)⁻¹ x.
 *
 * @param design             column-major rows×columns
 * @param unscaledCovariance (XᵀWX)⁻¹
 */
export function leverages(design: Float64Array, weights: Float64Array, unscaledCovariance: number[][]): Float64Array {
  const rows = weights.length;
  const row = new Float64Array(unscaledCovariance.length);
  const hats = new Float64Array(rows);
  for (let i = 0; i < rows; i++) {
    for (let k = 0; k < row.length; k++) row[k] = design[k * rows + i]!;
    hats[i] = weights[i]! * quadraticForm(unscaledCovariance, row);
  }
  return hats;
}
