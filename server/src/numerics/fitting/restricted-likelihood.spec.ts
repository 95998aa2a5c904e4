import { EigenvalueDecomposition, inverse, Matrix } from 'ml-matrix';
import fc from 'fast-check';
import { likelihoodAt, type SeriesProducts, type VarianceComponents } from './restricted-likelihood.js';
import { seriesProducts } from './series-products.js';
import { fitComponents } from './variance-components.js';

/** A small mixed model: rows [x, z, y, v] by series, X = [1, x], Z = [1, z]. */
interface Model {
  readonly rows: readonly (readonly (readonly [number, number, number, number])[])[];
  readonly common: readonly number[];
}

const row = fc.tuple(
  fc.double({ min: -1, max: 1, noNaN: true }),
  fc.double({ min: -1.5, max: 1.5, noNaN: true }),
  fc.double({ min: -2, max: 2, noNaN: true }),
  fc.double({ min: 0.2, max: 2, noNaN: true }),
);
const models: fc.Arbitrary<Model> = fc.record({
  rows: fc.array(fc.array(row, { minLength: 2, maxLength: 5 }), { minLength: 3, maxLength: 4 }).map((series) =>
    // A row at either end keeps the two columns of X apart.
    series.map((one, s) => (s === 0 ? [...one, [-1, -1, 0.3, 1] as const, [1, 1, -0.2, 1] as const] : one)),
  ),
  common: fc.array(fc.double({ min: 0, max: 0.5, noNaN: true }), { minLength: 4, maxLength: 4 }),
});
const components: fc.Arbitrary<VarianceComponents> = fc
  .record({
    scale: fc.double({ min: 0.5, max: 3, noNaN: true }),
    a: fc.double({ min: 0, max: 1.5, noNaN: true }),
    b: fc.double({ min: -1, max: 1, noNaN: true }),
    c: fc.double({ min: 0, max: 1, noNaN: true }),
  })
  .map(({ scale, a, b, c }) => ({ scale, between: { intercept: a * a, covariance: a * b, slope: b * b + c * c } }));

function productsOf({ rows, common }: Model): SeriesProducts[] {
  const flat = rows.flat();
  const seriesStart = new Int32Array(rows.length + 1);
  rows.forEach((one, s) => (seriesStart[s + 1] = seriesStart[s]! + one.length));
  const column = (k: number) => Float64Array.from(flat, (each) => each[k]!);
  return seriesProducts(
    { count: flat.length, seriesCount: rows.length, seriesStart },
    {
      design: new Float64Array([...column(0).fill(1), ...column(0)]),
      slope: column(1),
      response: column(2),
      variances: column(3),
      common: Float64Array.from(common),
    },
  );
}

/** The textbook formulas with every matrix written out: −2 ln L less its constants, β and its covariance. */
function writtenOut({ rows, common }: Model, { scale, between }: VarianceComponents, restricted: boolean) {
  const flat = rows.flatMap((one, s) => one.map(([x, z, y, v]) => ({ s, x, z, y, v })));
  const covariance = Matrix.zeros(flat.length, flat.length);
  flat.forEach((a, i) =>
    flat.forEach((b, j) => {
      if (a.s !== b.s) return;
      const shared =
        between.intercept + common[a.s]! ** 2 + between.covariance * (a.z + b.z) + between.slope * a.z * b.z;
      covariance.set(i, j, shared + (i === j ? scale * a.v : 0));
    }),
  );
  const v = inverse(covariance);
  const x = new Matrix(flat.map((each) => [1, each.x]));
  const y = Matrix.columnVector(flat.map((each) => each.y));
  const information = x.transpose().mmul(v).mmul(x);
  const ofBeta = inverse(information);
  const beta = ofBeta.mmul(x.transpose()).mmul(v).mmul(y);
  const residual = Matrix.sub(y, x.mmul(beta));
  const quadratic = residual.transpose().mmul(v).mmul(residual).get(0, 0);
  const ln = (matrix: Matrix) =>
    new EigenvalueDecomposition(matrix, { assumeSymmetric: true }).realEigenvalues.reduce(
      (sum, e) => sum + Math.log(e),
      0,
    );
  // Constant in the components, and left out there: Σ ln v.
  const lnV = ln(covariance) - flat.reduce((sum, each) => sum + Math.log(each.v), 0);
  return { value: lnV + quadratic + (restricted ? ln(information) : 0), beta, ofBeta, quadratic };
}

describe('likelihoodAt', () => {
  it.each([true, false])('is the textbook likelihood with every matrix written out (restricted: %s)', (restricted) => {
    fc.assert(
      fc.property(models, components, (model, at) => {
        const expected = writtenOut(model, at, restricted);
        const actual = likelihoodAt(productsOf(model), at, restricted);

        expect(actual.value).toBeCloseTo(expected.value, 8);
        expect(actual.quadratic).toBeCloseTo(expected.quadratic, 8);
        actual.beta.forEach((value, k) => expect(value).toBeCloseTo(expected.beta.get(k, 0), 8));
        actual.covariance.flat().forEach((value, k) => expect(value).toBeCloseTo(expected.ofBeta.to1DArray()[k]!, 8));
      }),
      { numRuns: 60, seed: 1 },
    );
  });

  it.each([true, false])('has the gradient that central differences give (restricted: %s)', (restricted) => {
    const width = 1e-5;
    fc.assert(
      fc.property(models, components, (model, { scale, between }) => {
        const products = productsOf(model);
        const value = (at: VarianceComponents) => likelihoodAt(products, at, restricted).value;
        const slope = (at: (by: number) => VarianceComponents) => (value(at(width)) - value(at(-width))) / (2 * width);
        const beside = (key: keyof typeof between) =>
          slope((by) => ({ scale, between: { ...between, [key]: between[key] + by } }));
        const { byScale, byBetween } = likelihoodAt(products, { scale, between }, restricted);

        expect(byScale).toBeCloseTo(
          slope((by) => ({ scale: scale + by, between })),
          4,
        );
        expect(byBetween.intercept).toBeCloseTo(beside('intercept'), 4);
        expect(byBetween.covariance).toBeCloseTo(beside('covariance'), 4);
        expect(byBetween.slope).toBeCloseTo(beside('slope'), 4);
      }),
      { numRuns: 60, seed: 2 },
    );
  });
});

describe('fitComponents', () => {
  it('ends where no other components are likelier', () => {
    const model = {
      leastScale: 0,
      estimated: 'INTERCEPT_AND_SLOPE',
      assigned: { intercept: 0, covariance: 0, slope: 0 },
    } as const;
    fc.assert(
      fc.property(models, components, (data, other) => {
        const products = productsOf(data);
        const best = fitComponents(products, model, true, null);

        expect(best.at.value).toBeLessThanOrEqual(likelihoodAt(products, other, true).value + 1e-8);
      }),
      { numRuns: 60, seed: 3 },
    );
  });
});
