import { describe, expect, it } from '@jest/globals';
import { blanc } from './blanc.js';

const methane = { moleFraction: 2 / 3, diffusivity: 1.86e-5, relativeUncertainty: 0.02 };
const hydrogen = { moleFraction: 1 / 3, diffusivity: 6.99e-5, relativeUncertainty: 0.03 };

describe('blanc', () => {
  it('gives 2.46e-5 m²/s for oxygen in methane and hydrogen, two to one by volume', () => {
    // Treybal, Mass-Transfer Operations, 3rd ed., 1980, Illustration 2.1b (answer from memory).
    expect((blanc([methane, hydrogen]).diffusivity * 1e5).toFixed(2)).toBe('2.46');
  });

  it('carries the uncertainty of each diffusivity with the weight of its resistance', () => {
    const { diffusivity, relativeUncertainty } = blanc([methane, hydrogen]);
    const shares = [methane, hydrogen].map((gas) => (diffusivity * gas.moleFraction) / gas.diffusivity);
    expect((shares[0] ?? NaN) + (shares[1] ?? NaN)).toBeCloseTo(1, 12);
    expect(relativeUncertainty).toBeCloseTo(Math.hypot(0.02 * (shares[0] ?? NaN), 0.03 * (shares[1] ?? NaN)), 12);
  });

  it('gives the diffusivity in the one gas of a bath of one', () => {
    const alone = blanc([{ ...methane, moleFraction: 1 }]);
    expect(alone.diffusivity).toBeCloseTo(1.86e-5, 18);
    expect(alone.relativeUncertainty).toBeCloseTo(0.02, 15);
  });

  it('refuses fractions that do not sum to one, and what is not positive', () => {
    expect(() => blanc([methane])).toThrow(/sum to/);
    expect(() => blanc([])).toThrow(RangeError);
    expect(() => blanc([{ ...methane, moleFraction: 1, diffusivity: 0 }])).toThrow(/positive/);
  });
});
