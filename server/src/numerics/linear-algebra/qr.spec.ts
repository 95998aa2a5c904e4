import { Matrix, QrDecomposition } from 'ml-matrix';
import fc from 'fast-check';
import { applyQ, applyQTransposed, columnNorms, dependentColumn, factorise, inverseGram, solveUpper } from './qr.js';
import { inverseAndLogDeterminant } from './positive-definite.js';

const ROWS = 6;
const COLUMNS = 3;
const element = fc.double({ min: -10, max: 10, noNaN: true });
const matrix = fc.array(element, { minLength: ROWS * COLUMNS, maxLength: ROWS * COLUMNS }).map((values) => {
  // A diagonal that no other element reaches keeps the columns apart.
  for (let k = 0; k < COLUMNS; k++) values[k * ROWS + k] = 60 + k;
  return Float64Array.from(values);
});
const vector = fc.array(element, { minLength: ROWS, maxLength: ROWS }).map((values) => Float64Array.from(values));

function columnsOf(values: Float64Array): Matrix {
  return new Matrix(
    Array.from({ length: ROWS }, (_, i) => Array.from({ length: COLUMNS }, (__, k) => values[k * ROWS + i]!)),
  );
}

describe('factorise', () => {
  it('solves least squares as the general matrix package does', () => {
    fc.assert(
      fc.property(matrix, vector, (a, b) => {
        const expected = new QrDecomposition(columnsOf(a)).solve(Matrix.columnVector([...b]));
        const factors = factorise(a.slice(), ROWS, COLUMNS);
        const rotated = b.slice();
        applyQTransposed(factors, rotated);

        solveUpper(factors, rotated).forEach((value, k) => expect(value).toBeCloseTo(expected.get(k, 0), 10));
      }),
    );
  });

  it('gives an orthogonal Q', () => {
    fc.assert(
      fc.property(matrix, vector, (a, b) => {
        const factors = factorise(a.slice(), ROWS, COLUMNS);
        const there = b.slice();
        applyQTransposed(factors, there);
        applyQ(factors, there);

        there.forEach((value, i) => expect(value).toBeCloseTo(b[i]!, 11));
      }),
    );
  });

  it('gives (AᵀA)⁻¹', () => {
    fc.assert(
      fc.property(matrix, (a) => {
        const full = columnsOf(a);
        const product = full
          .transpose()
          .mmul(full)
          .mmul(new Matrix(inverseGram(factorise(a.slice(), ROWS, COLUMNS))));

        expect(product.sub(Matrix.eye(COLUMNS)).norm()).toBeLessThan(1e-10);
      }),
    );
  });

  it('names the column that depends on those before it', () => {
    const dependent = new Float64Array([1, 2, 3, 4, 1, 1, 1, 1, 3, 5, 7, 9]);
    const norms = columnNorms(dependent, 4, 3);

    expect(dependentColumn(factorise(dependent, 4, 3), norms, 1e-9)).toBe(2);
  });

  it('measures columns whose squares overflow or underflow', () => {
    const [large, small] = columnNorms(new Float64Array([3e200, 4e200, 3e-200, 4e-200]), 2, 2);

    expect([large! / 5e200, small! / 5e-200]).toEqual([expect.closeTo(1, 14), expect.closeTo(1, 14)]);
  });
});

describe('inverseAndLogDeterminant', () => {
  it('agrees with the inverse and determinant by hand', () => {
    const { inverse, lnDeterminant } = inverseAndLogDeterminant([
      [4, 2],
      [2, 3],
    ]);

    expect(Math.exp(lnDeterminant)).toBeCloseTo(8, 12);
    expect(inverse.flat()).toEqual([3 / 8, -2 / 8, -2 / 8, 4 / 8].map((value) => expect.closeTo(value, 14)));
  });

  it('is NaN where the matrix is not positive definite', () => {
    const { lnDeterminant } = inverseAndLogDeterminant([
      [1, 2],
      [2, 1],
    ]);

    expect(lnDeterminant).toBeNaN();
  });
});
