import {
  formatConcise,
  formatDate,
  formatExtent,
  formatNumber,
  formatQuantity,
  formatShort,
  formatSigned,
  formatSignificant,
  formatUncertainty,
  placesFor,
} from './format-quantity.js';

describe('rounding of a value and its uncertainty (GUM, JCGM 100:2008, 7.2.6)', () => {
  // Example of 7.2.2: m = 100.02147 g with u = 0.35 mg, "m_S = 100,021 47(35) g", the figure in parentheses being u in the
  // last digits of the quoted result.
  it('prints the example of GUM 7.2.2 as GUM prints it, the point as decimal sign', () => {
    expect(formatConcise(100.021_47, 0.000_35)).toBe('100.02147(35)');
  });

  it('keeps two significant digits of u and the value to the same place', () => {
    expect(formatConcise(0.124_553, 0.000_5)).toBe('0.12455(50)');
    expect(formatConcise(1.788_12, 0.027)).toBe('1.788(27)');
    expect(formatConcise(12.345, 1.23)).toBe('12.3(12)');
    expect(formatConcise(1240, 35.4)).toBe('1\u2009240(35)');
  });

  it('lets u carry over to the next place', () => {
    expect(placesFor(0.0996)).toBe(2);
    expect(formatConcise(5.4321, 0.0996)).toBe('5.43(10)');
    expect(formatUncertainty(0.000_999)).toBe('0.0010');
  });

  it('never prints places before the decimal sign as rounded away', () => {
    expect(formatConcise(123_456, 789)).toBe('123\u2009456(789)');
  });

  it('shows a value without uncertainty with the digits it has', () => {
    expect(formatConcise(298.15, 0)).toBe('298.15');
  });
});

describe('numbers as the sheet prints them', () => {
  it('takes a true minus, and none on what rounds to zero', () => {
    expect(formatNumber(-0.388, 3)).toBe('−0.388');
    expect(formatNumber(-0.0004, 3)).toBe('0.000');
    expect(formatSigned(-0.04, 1)).toBe('0.0');
    expect(formatSigned(6.12, 1)).toBe('+6.1');
  });

  it('groups digits in threes with thin spaces from four digits up', () => {
    expect(formatShort(400_000)).toBe('400\u2009000');
    expect(formatShort(1000)).toBe('1\u2009000');
    expect(formatShort(0.000_012)).toBe('0.000012');
  });

  it('prints temperature in K and pressure in kPa, on one line with the unit', () => {
    expect(formatQuantity('pressure', 101_325)).toBe('101.325\u00a0kPa');
    expect(formatQuantity('celsius', 298.15)).toBe('25\u00a0°C');
    expect(formatExtent('temperature', 283.15, 448.15)).toBe('283.15\u00a0K to 448.15\u00a0K');
  });

  it('keeps zeros that are significant', () => {
    expect(formatSignificant(0.126, 4)).toBe('0.1260');
    expect(formatSignificant(0.099_99, 3)).toBe('0.100');
  });

  it('names the day in UTC', () => {
    expect(formatDate('2026-11-04T23:59:59.000Z')).toBe('4 November 2026');
  });
});
