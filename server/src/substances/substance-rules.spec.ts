import { describe, expect, it } from '@jest/globals';
import { type ConstantFacts, type SubstanceFacts, substanceProblems } from './substance-rules.js';

/** Argon: CAS RN and molar mass from memory. */
const ARGON: SubstanceFacts = { name: 'argon', formula: 'Ar', casNumber: '7440-37-1', molarMass: 0.039948 };
/** Invented value. */
const VOLUME: ConstantFacts = { kind: 'DIFFUSION_VOLUME', value: 16, unit: '1', source: 'Invented' };
/** Invented coefficients. */
const ANTOINE: ConstantFacts = {
  kind: 'VAPOUR_PRESSURE',
  form: 'ANTOINE',
  coefficients: ['A', 'B', 'C'].map((symbol) => ({ symbol, value: 1 })),
  unit: 'Pa',
  source: 'Invented',
};

const problems = (change: Partial<SubstanceFacts>) =>
  substanceProblems({ ...ARGON, ...change }).map(({ code, path }) => `${code} ${path}`);
const problemsOf = (change: Partial<ConstantFacts>, constant = VOLUME) =>
  problems({ constants: [VOLUME, { ...constant, ...change }] });

describe('a substance', () => {
  it('is sound with its constants, and without a CAS RN where none is assigned', () => {
    expect(problems({ constants: [VOLUME, ANTOINE] })).toEqual([]);
    expect(problems({ casNumber: null })).toEqual([]);
  });

  it.each([
    [{ name: ' ' }, 'name'],
    [{ formula: '' }, 'formula'],
    [{ casNumber: '7440-37-2' }, 'casNumber'],
    [{ molarMass: 0 }, 'molarMass'],
    [{ molarMass: 39.948 }, 'molarMass'],
    [{ molarMass: Number.NaN }, 'molarMass'],
  ])('is not %j', (change, path) => {
    expect(problems(change)).toEqual([`BAD_INPUT ${path}`]);
  });
});

describe('a constant', () => {
  it.each([
    ['neither value nor equation', { value: null }, 'value'],
    ['both', { form: 'ANTOINE' as const, coefficients: ANTOINE.coefficients ?? [] }, 'value'],
    ['another unit than its kind’s', { unit: 'cm3/mol' }, 'unit'],
    ['no source', { source: ' ' }, 'source'],
    ['a range from 0 K', { temperatureMinimum: 0 }, 'temperatureMinimum'],
    ['a range that ends where it begins', { temperatureMinimum: 300, temperatureMaximum: 300 }, 'temperatureMaximum'],
  ])('is refused with %s', (_, change, field) => {
    expect(problemsOf(change)).toEqual([`BAD_INPUT constants.1.${field}`]);
  });

  it('is refused as an equation that lacks a coefficient', () => {
    const coefficients = [{ symbol: 'A', value: 1 }];
    expect(problemsOf({ coefficients }, ANTOINE)).toEqual(['BAD_INPUT constants.1.coefficients']);
    expect(problemsOf({ coefficients: null }, ANTOINE)).toEqual(['BAD_INPUT constants.1.coefficients']);
  });
});
