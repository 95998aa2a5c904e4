import fc from 'fast-check';
import { availableForms, findForm } from './forms.js';

const reference = { temperature: 298.15, pressure: 101325 };
const values = fc.double({ min: -3, max: 3, noNaN: true });

describe.each(availableForms.map((name) => ({ name, form: findForm(name)! })))('the form $name', ({ form }) => {
  const shapes = fc.array(values, { minLength: form.parameters.length - 1, maxLength: form.parameters.length - 1 });

  it('begins with D0 in m²/s and has the value D0 at the reference state', () => {
    expect(form.parameters[0]).toMatchObject({ symbol: 'D0', unit: 'm2/s' });
    fc.assert(fc.property(shapes, (shape) => expect(form.lnRatio(shape, 0, 0, reference)).toBeCloseTo(0, 15)));
  });

  it('has the derivatives that central differences give', () => {
    const width = 1e-5;
    fc.assert(
      fc.property(shapes, values, values, (shape, x, p) => {
        const gradient = new Float64Array(shape.length);
        form.lnRatioGradient(shape, x, p, reference, gradient);
        const along = (k: number, by: number) => shape.map((value, j) => (j === k ? value + by : value));
        const slope = (above: number, below: number) => (above - below) / (2 * width);

        shape.forEach((_, k) => {
          const above = form.lnRatio(along(k, width), x, p, reference);
          const below = form.lnRatio(along(k, -width), x, p, reference);
          expect(gradient[k]).toBeCloseTo(slope(above, below), 7);
        });
        const ofT = slope(form.lnRatio(shape, x + width, p, reference), form.lnRatio(shape, x - width, p, reference));
        const ofP = slope(form.lnRatio(shape, x, p + width, reference), form.lnRatio(shape, x, p - width, reference));
        expect(form.temperatureExponent(shape, x, reference)).toBeCloseTo(ofT, 7);
        expect(form.pressureExponent(shape)).toBeCloseTo(ofP, 7);
      }),
    );
  });

  it('finds the shape again from exact values', () => {
    fc.assert(
      fc.property(shapes, (shape) => {
        const x = new Float64Array([-0.2, 0, 0.1, 0.4, 0.7]);
        const p = new Float64Array([0.3, -0.1, 0.5, 0, -0.6]);
        const lnDiffusivity = x.map((each, i) => -10.8 + form.lnRatio(shape, each, p[i]!, reference));

        form.start({ x, p, lnDiffusivity }, reference).forEach((value, k) => expect(value).toBeCloseTo(shape[k]!, 10));
      }),
    );
  });

  it('is the same function restated elsewhere', () => {
    const elsewhere = { temperature: 500, pressure: 2e4 };
    const [x0, p0] = [Math.log(500 / 298.15), Math.log(2e4 / 101325)];
    fc.assert(
      fc.property(shapes, values, values, (shape, x, p) => {
        const { shape: restated } = form.restate(shape, reference, elsewhere);
        const here = form.lnRatio(shape, x, p, reference) - form.lnRatio(shape, x0, p0, reference);

        expect(form.lnRatio(restated, x - x0, p - p0, elsewhere)).toBeCloseTo(here, 10);
      }),
    );
  });

  it('prints an expression in T and P with its numbers in place', () => {
    const printed = form.print([2e-5, ...form.parameters.slice(1).map((_, k) => 1.5 + k / 8)], reference);

    expect(printed).toMatch(/^0\.00002 \* /);
    expect(printed).toContain('T / 298.15');
    expect(printed).toContain('101325 / P');
  });
});

it('findForm knows the forms that are there and no other', () => {
  expect(availableForms).toEqual(['POWER_LAW', 'POWER_LAW_FREE_PRESSURE']);
  expect(findForm('SUTHERLAND')).toBeNull();
});
