import { describe, expect, it } from '@jest/globals';
import { collisionIntegral, combinedPotential, isInCollisionIntegralRange } from './collision-integral.js';

describe('collisionIntegral', () => {
  // Bird, Stewart, Lightfoot 2002, Table E.2, after Monchick & Mason, J. Chem. Phys. 35 (1961) 1676.
  it.each([
    [0.3, 2.649],
    [0.5, 2.066],
    [0.8, 1.612],
    [1.0, 1.44],
    [1.3, 1.274],
    [2.0, 1.075],
    [3.0, 0.95],
    [5.0, 0.8428],
    [10.0, 0.7422],
    [20.0, 0.664],
    [50.0, 0.5763],
  ])('agrees within 0.11 % with the printed table at T* = %p', (reducedTemperature, printed) => {
    expect(Math.abs(collisionIntegral(reducedTemperature) / printed - 1)).toBeLessThan(0.0011);
  });

  it('is 0.25 % below the printed table at its upper end, where the table itself is 0.24 % high', () => {
    expect(collisionIntegral(100) / 0.518 - 1).toBeCloseTo(-0.0025, 4);
  });

  it('refuses a reduced temperature for which the equation was not fitted', () => {
    expect(() => collisionIntegral(0.29)).toThrow(RangeError);
    expect(() => collisionIntegral(100.1)).toThrow(RangeError);
    expect(isInCollisionIntegralRange(Number.NaN)).toBe(false);
  });
});

describe('combinedPotential', () => {
  it('takes the arithmetic mean of σ and the geometric mean of ε', () => {
    // Carbon monoxide and carbon dioxide, Bird, Stewart, Lightfoot 2002, Example 17.3-1 (inputs from memory).
    const combined = combinedPotential({ diameter: 3.59e-10, depth: 110 }, { diameter: 3.996e-10, depth: 190 });
    expect(combined.diameter).toBeCloseTo(3.793e-10, 20);
    expect(combined.depth).toBeCloseTo(144.57, 2);
  });
});
