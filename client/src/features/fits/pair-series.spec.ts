import { describe, expect, it } from 'vitest';
import { deviationRange, logRange, temperaturesAlong } from './figure-ranges';
import { lnDeviationFrom } from './pair-series';

describe('a point that no fit knows', () => {
  // A power law is a straight line in ln D, ln T, so its deviation from the drawn curve is exact.
  const temperatures = temperaturesAlong({ min: 250, max: 500 }, 7);
  const curve = { temperatures, diffusivities: temperatures.map((T) => 1.2e-5 * (T / 298.15) ** 1.8) };

  it('lies from the curve by the logarithm of their ratio', () => {
    const fitted = 1.2e-5 * (333 / 298.15) ** 1.8;
    expect(lnDeviationFrom(curve, 333, fitted * 1.05)).toBeCloseTo(Math.log(1.05), 12);
  });

  it('has no deviation beyond the curve, or without one', () => {
    expect(lnDeviationFrom(curve, 600, 1e-5)).toBeNull();
    expect(lnDeviationFrom(null, 300, 1e-5)).toBeNull();
  });
});

describe('the range of an axis', () => {
  it('holds all values with a little room, on a logarithmic axis', () => {
    const { min, max } = logRange([200, 400], 0.05);
    expect(min).toBeLessThan(200);
    expect(max / 400).toBeCloseTo(200 / min, 12);
  });

  it('about zero is made by what carries weight; what is left out widens it only so far', () => {
    expect(deviationRange([-2, 1], 1)).toEqual({ min: -2.2, max: 2.2 });
    expect(deviationRange([-2, 1], 1, [4]).max).toBeCloseTo(4.4, 12);
    expect(deviationRange([-2, 1], 1, [40]).max).toBeCloseTo(2.2, 12);
  });
});
