import { afterEach, describe, expect, it } from 'vitest';
import { defaultUnits, differenceFromSi, fromSi, readerUnits, toSi, unitLabel } from './units';

describe('units of the reader', () => {
  // SI Brochure, 9th ed., 2.3.1: t/°C = T/K − 273.15. NIST SP 811 (2008), B.8: T/K = (t/°F + 459.67)/1.8.
  it.each([
    [25, 'degC', 298.15],
    [32, 'degF', 273.15],
    [-459.67, 'degF', 0],
    [298.15, 'K', 298.15],
  ] as const)('takes %d %s for the temperature it is', (value, unit, kelvin) => {
    expect(toSi('temperature', value, unit)).toBe(kelvin);
    expect(fromSi('temperature', kelvin, unit)).toBeCloseTo(value, 10);
  });

  // NIST SP 811 (2008), B.8: 1 atm = 101 325 Pa, 1 bar = 100 000 Pa, 760 Torr = 1 atm, all exact.
  it.each([
    [1, 'atm', 101_325],
    [1, 'bar', 100_000],
    [760, 'Torr', 101_325],
    [101.325, 'kPa', 101_325],
    [101_325, 'Pa', 101_325],
  ] as const)('takes %d %s for the pressure it is', (value, unit, pascal) => {
    expect(toSi('pressure', value, unit)).toBe(pascal);
    expect(fromSi('pressure', pascal, unit)).toBe(value);
  });

  it('scales diffusivities by exact powers of ten', () => {
    expect(fromSi('diffusivity', 1.2455e-5, 'cm2_s')).toBe(0.12455);
    expect(fromSi('diffusivity', 1.2455e-5, 'mm2_s')).toBe(12.455);
    expect(toSi('diffusivity', 0.12455, 'cm2_s')).toBe(1.2455e-5);
  });

  it('takes no zero point off a difference', () => {
    expect(differenceFromSi('temperature', 0.5, 'degC')).toBe(0.5);
    expect(differenceFromSi('temperature', 0.5, 'degF')).toBe(0.9);
  });
});

describe('the remembered choice', () => {
  afterEach(() => readerUnits.set(defaultUnits));

  it('is K, kPa and cm²/s until another is made', () => {
    expect(readerUnits.get()).toEqual({ temperature: 'K', pressure: 'kPa', diffusivity: 'cm2_s' });
    expect(unitLabel('diffusivity', readerUnits.get().diffusivity)).toBe('cm²/s');
  });

  it('is kept in the browser', () => {
    readerUnits.set({ ...defaultUnits, pressure: 'Torr' });
    expect(JSON.parse(localStorage.getItem('diffolio.units') ?? '{}')).toMatchObject({ pressure: 'Torr' });
  });
});
