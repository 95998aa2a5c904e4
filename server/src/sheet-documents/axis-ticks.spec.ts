import fc from 'fast-check';
import { logarithmicAxis, multiplesOf, roundStep, deviationAxis, temperatureAxis } from './axis-ticks.js';

describe('figures on an axis', () => {
  it('stand at rounded temperatures', () => {
    expect(temperatureAxis(276, 460).ticks).toEqual([280, 300, 320, 340, 360, 380, 400, 420, 440, 460]);
    expect(temperatureAxis(195, 1030).ticks).toEqual([200, 300, 400, 500, 600, 700, 800, 900, 1000]);
  });

  it('follow a decade where the extent is a decade, and are finer where it is not', () => {
    expect(logarithmicAxis(1e-6, 1e-4).ticks).toEqual([1e-6, 2e-6, 5e-6, 1e-5, 2e-5, 5e-5, 1e-4]);
    expect(logarithmicAxis(1.05e-5, 2.8e-5).ticks).toEqual([1.2e-5, 1.5e-5, 2e-5, 2.5e-5]);
    expect(logarithmicAxis(2.01e-5, 2.09e-5).ticks).toEqual([2.02e-5, 2.04e-5, 2.06e-5, 2.08e-5]);
  });

  it('lie on both sides of no deviation', () => {
    expect(deviationAxis(-4.1, 8.3).ticks).toEqual([-6, -4, -2, 0, 2, 4, 6, 8, 10]);
    expect(deviationAxis(0, 0).ticks).toEqual([-1, 0, 1]);
  });

  it('are few, ascending and inside the limits, whatever the extent', () => {
    const positive = fc.double({ min: 1e-9, max: 1e6, noNaN: true });
    fc.assert(
      fc.property(positive, fc.double({ min: 1.001, max: 1e4, noNaN: true }), (minimum, ratio) => {
        const { ticks, maximum } = logarithmicAxis(minimum, minimum * ratio);
        expect(ticks.length).toBeGreaterThanOrEqual(2);
        expect(ticks.length).toBeLessThanOrEqual(16);
        expect(ticks).toEqual([...ticks].sort((a, b) => a - b));
        expect(ticks.every((tick) => tick >= minimum * 0.999_999 && tick <= maximum * 1.000_001)).toBe(true);
      }),
    );
  });

  it('are the multiples of a step of 1, 2 or 5 times a power of ten', () => {
    expect(roundStep(165, 18)).toBe(10);
    expect(roundStep(0.3, 6)).toBeCloseTo(0.05, 12);
    expect(multiplesOf(0.1, 0.1, 0.3)).toEqual([0.1, 0.2, 0.3]);
  });
});
