import { type FitColumns } from './fit-columns.js';
import { type SeriesProducts } from './restricted-likelihood.js';

/** Columns of a mixed model on the tangent; `design` is column-major, `common` has one element a series. */
export interface TangentColumns {
  readonly design: Float64Array;
  readonly slope: Float64Array;
  readonly response: Float64Array;
  readonly variances: Float64Array;
  readonly common: Float64Array;
}

/** The weighted cross products of each series. */
export function seriesProducts(
  columns: Pick<FitColumns, 'count' | 'seriesCount' | 'seriesStart'>,
  tangent: TangentColumns,
): SeriesProducts[] {
  return Array.from({ length: columns.seriesCount }, (_, s) =>
    productsOf(tangent, columns.count, columns.seriesStart[s]!, columns.seriesStart[s + 1]!, tangent.common[s]!),
  );
}

function productsOf(tangent: TangentColumns, rows: number, from: number, to: number, common: number): SeriesProducts {
  const { design, slope, response, variances } = tangent;
  const size = design.length / rows;
  const xx = new Float64Array(size * size);
  const xz = new Float64Array(2 * size);
  const xy = new Float64Array(size);
  const zz = { intercept: 0, covariance: 0, slope: 0 };
  let y0 = 0;
  let y1 = 0;
  let yy = 0;
  for (let i = from; i < to; i++) {
    const weight = 1 / variances[i]!;
    const z = slope[i]!;
    const y = response[i]!;
    zz.intercept += weight;
    zz.covariance += weight * z;
    zz.slope += weight * z * z;
    y0 += weight * y;
    y1 += weight * y * z;
    yy += weight * y * y;
    for (let k = 0; k < size; k++) {
      const weighted = weight * design[k * rows + i]!;
      for (let l = 0; l < size; l++) xx[k * size + l]! += weighted * design[l * rows + i]!;
      xz[2 * k]! += weighted;
      xz[2 * k + 1]! += weighted * z;
      xy[k]! += weighted * y;
    }
  }
  return { xx, xz, zz, xy, zy: [y0, y1], yy, count: to - from, commonVariance: common ** 2 };
}
