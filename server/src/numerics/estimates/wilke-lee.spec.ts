import { describe, expect, it } from '@jest/globals';
import { wilkeLee } from './wilke-lee.js';

describe('wilkeLee', () => {
  it('gives 0.0952 cm²/s for carbon disulfide in air at 273 K and 1 bar', () => {
    // Benítez, Principles and Modern Applications of Mass Transfer Operations, 2nd ed., 2009, Illustration 1.6
    // (inputs as printed, answer from memory). Measured: 0.0894 cm²/s at 1 bar, Table A.1 of the same book.
    const carbonDisulfide = { molarMass: 0.076, potential: { diameter: 4.483e-10, depth: 467 } };
    const air = { molarMass: 0.029, potential: { diameter: 3.62e-10, depth: 97 } };
    const diffusivity = wilkeLee(carbonDisulfide, air, { temperature: 273, pressure: 1e5 });
    expect((diffusivity * 1e4).toFixed(4)).toBe('0.0952');
    expect(Math.abs(diffusivity / 9.5221e-6 - 1)).toBeLessThan(2e-5);
  });

  it('is 1 % below the older form for nitrogen in carbon dioxide at 298 K and 101.3 kPa', () => {
    // Anantharaman & Meera Sheriffa Begum, Elements of Mass Transfer, Part 1, Example 2.1a: 1.678856e-5 m²/s with the
    // older factor 1.084 − 0.249 (1/M_A + 1/M_B)^(1/2) and a collision integral of 1.0 read from a chart.
    const nitrogen = { molarMass: 0.028, potential: { diameter: 3.798e-10, depth: 71.4 } };
    const carbonDioxide = { molarMass: 0.044, potential: { diameter: 3.941e-10, depth: 195.2 } };
    const diffusivity = wilkeLee(nitrogen, carbonDioxide, { temperature: 298, pressure: 101_300 });
    const printed = 1.678856e-5;
    expect(diffusivity / printed).toBeGreaterThan(0.98);
    expect(diffusivity / printed).toBeLessThan(1);
  });
});
