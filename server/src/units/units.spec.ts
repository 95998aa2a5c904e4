import fc from 'fast-check';
import { add, exactDecimal, multiply, toNumber } from './exact-decimal.js';
import { UNITS } from './unit-table.js';
import { differenceToSi, fromSi, parseUnit, toSi, unitOf, unitsOf } from './units.js';

// Expected values: SI Brochure, 9th edition (BIPM 2019), sections 2.3 and 4, and NIST SP 811 (2008), appendix B.8
// (Thompson & Taylor, Guide for the Use of the International System of Units); where SP 811 prints seven digits, so do these.
describe('conversion to SI', () => {
  it.each([
    ['25', '°C', 298.15],
    ['30.1', '°C', 303.25],
    ['-273.15', '°C', 0],
    ['32', '°F', 273.15],
    ['212', '°F', 373.15],
    ['491.67', '°R', 273.15],
    ['1', 'atm', 101325],
    ['760', 'Torr', 101325],
    ['1013.25', 'mbar', 101325],
    ['1013.25', 'hPa', 101325],
    ['101.325', 'kPa', 101325],
    ['0.101325', 'MPa', 101325],
    ['1.01325', 'bar', 101325],
    ['0.1249', 'cm²/s', 1.249e-5],
    ['12.49', 'mm²/s', 1.249e-5],
    ['0.25', '%', 0.0025],
  ])('takes %s %s to the nearest double', (value, unit, si) => {
    expect(toSi(value, unitOf(unit))).toBe(si);
  });

  it.each([
    ['psi', 6894.757],
    ['mmHg', 133.3224],
    ['Torr', 133.3224],
    ['ft²/h', 2.58064e-5],
    ['ft²/s', 9.290304e-2],
    ['in²/s', 6.4516e-4],
  ])('agrees with the printed factor of %s', (unit, printed) => {
    expect(Number(toSi(1, unitOf(unit)).toPrecision(7))).toBe(printed);
  });

  it('keeps the zero of a scale out of an uncertainty', () => {
    expect(differenceToSi('0.05', unitOf('°C'))).toBe(0.05);
    expect(differenceToSi('1.8', unitOf('°F'))).toBe(1);
  });

  it('rounds as whole numbers of any length do, also where it takes the short way', () => {
    const decimals = fc
      .tuple(fc.boolean(), fc.integer({ min: 0, max: 999_999_999 }), fc.integer({ min: 0, max: 9 }))
      .map(([isNegative, digits, places]) => `${isNegative ? '-' : ''}${(digits / 10 ** places).toFixed(places)}`);
    fc.assert(
      fc.property(fc.constantFrom(...UNITS), decimals, (unit, decimal) => {
        const exact = multiply(add(exactDecimal(decimal)!, unit.offset), unit.factor);
        expect(toSi(decimal, unit)).toBe(toNumber(exact));
      }),
      { numRuns: 2000 },
    );
  });

  it('comes back to the number that was typed', () => {
    const typed = fc.double({ min: 1e-9, max: 1e9, noNaN: true });
    fc.assert(
      fc.property(fc.constantFrom(...UNITS), typed, (unit, value) => {
        const back = fromSi(toSi(value, unit), unit);
        // Two roundings, and on scales with an offset the digits that the offset pushes out.
        const lost = unit.offset.numerator === 0n ? value : value + 500;
        expect(Math.abs(back - value)).toBeLessThanOrEqual(4 * Number.EPSILON * lost);
      }),
    );
  });

  it('refuses what is not a decimal number', () => {
    expect(() => toSi('0,5', unitOf('K'))).toThrow(RangeError);
    expect(() => toSi(Number.NaN, unitOf('K'))).toThrow(RangeError);
  });
});

describe('reading a unit', () => {
  it.each([
    ['cm2/s', 'cm²/s'],
    ['cm^2 s-1', 'cm²/s'],
    ['cm² s⁻¹', 'cm²/s'],
    ['cm²·s⁻¹', 'cm²/s'],
    ['cm**2/s', 'cm²/s'],
    ['cm2.s-1', 'cm²/s'],
    ['cm^{2} s^{-1}', 'cm²/s'],
    ['sq cm/sec', 'cm²/s'],
    ['cm2 per s', 'cm²/s'],
    ['CM2/S', 'cm²/s'],
    ['m2 / s', 'm²/s'],
    ['[ft_i]2/h', 'ft²/h'],
    ['ft2/hr', 'ft²/h'],
    ['degC', '°C'],
    ['deg. C', '°C'],
    ['° C', '°C'],
    ['ºC', '°C'],
    ['℃', '°C'],
    ['Cel', '°C'],
    ['Kelvin', 'K'],
    ['mm Hg', 'mmHg'],
    ['torr', 'Torr'],
    ['ATM', 'atm'],
    ['Bar', 'bar'],
    ['kpa', 'kPa'],
    ['mol/mol', '1'],
    ['percent', '%'],
  ])('understands “%s” as %s', (text, symbol) => {
    expect(parseUnit(text)?.symbol).toBe(symbol);
  });

  it('understands a power of ten before the unit', () => {
    expect(toSi('2.5', parseUnit('10^-5 m²/s', 'diffusivity')!)).toBe(2.5e-5);
    expect(toSi('2.5', parseUnit('1e-5 m2/s', 'diffusivity')!)).toBe(2.5e-5);
    expect(toSi('2.5', parseUnit('10⁻⁵ m² s⁻¹', 'diffusivity')!)).toBe(2.5e-5);
    expect(toSi('2.5', parseUnit('×10⁻⁵ m² s⁻¹', 'diffusivity')!)).toBe(2.5e-5);
  });

  it('understands a power of ten again from the symbol it was given', () => {
    const unit = parseUnit('10^-5 m²/s')!;
    expect(parseUnit(unit.symbol)).toEqual(unit);
  });

  it('takes neither a millipascal for a megapascal nor a pressure for a temperature', () => {
    expect(parseUnit('mPa')).toBeNull();
    expect(parseUnit('kPa', 'temperature')).toBeNull();
    expect(parseUnit('furlong')).toBeNull();
    expect(parseUnit('')).toBeNull();
  });

  it('finds each unit again by its symbol, its UCUM code and its aliases', () => {
    for (const unit of UNITS) {
      for (const name of [unit.symbol, unit.ucum ?? unit.symbol, ...unit.aliases])
        expect(parseUnit(name)).toEqual(unit);
    }
  });

  it('puts the SI unit of a quantity first', () => {
    expect(unitsOf('temperature')[0]?.symbol).toBe('K');
    expect(unitsOf('pressure')[0]?.symbol).toBe('Pa');
    expect(unitsOf('diffusivity')[0]?.symbol).toBe('m²/s');
    expect(unitsOf('fraction')[0]?.symbol).toBe('1');
  });
});
