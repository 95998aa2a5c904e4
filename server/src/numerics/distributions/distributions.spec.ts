import { chiSquareExceedance } from './chi-square.js';
import { coverageFactor } from './student-t.js';

describe('coverageFactor', () => {
  // Source: JCGM 100:2008 (GUM), Table G.2, Student's t for a fraction p of 95 % and 95.45 %.
  it.each([
    [0.95, 1, 12.71],
    [0.95, 5, 2.57],
    [0.95, 20, 2.09],
    [0.9545, 10, 2.28],
    [0.95, null, 1.96],
    [0.9545, null, 2.0],
  ])('is that of the GUM at coverage %d and ν %p', (coverage, degreesOfFreedom, factor) => {
    expect(coverageFactor(coverage, degreesOfFreedom)).toBeCloseTo(factor, 2);
  });
});

describe('chiSquareExceedance', () => {
  it.each([2, 7.5, 20])('is exp(−χ²/2) for two degrees of freedom (χ² = %d)', (value) => {
    expect(chiSquareExceedance(value, 2)).toBeCloseTo(Math.exp(-value / 2), 12);
  });
});
