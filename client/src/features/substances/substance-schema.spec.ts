import { describe, expect, it } from 'vitest';
import { emptyConstant, emptySubstance, isCasNumber, substanceSchema, toInput } from './substance-schema';

describe('a CAS Registry Number', () => {
  // Water 7732-18-5, ethanol 64-17-5, nitrogen 7727-37-9: the CAS Registry. The check: CAS, “Check Digit Verification of CAS Registry Numbers”.
  it.each(['7732-18-5', '64-17-5', '7727-37-9'])('is taken with its own check digit: %s', (number) => {
    expect(isCasNumber(number)).toBe(true);
  });

  it.each(['7732-18-4', '64-17', '064-17-5', '64175', ''])('is refused otherwise: %j', (number) => {
    expect(isCasNumber(number)).toBe(false);
  });
});

const ethanol = {
  ...emptySubstance,
  name: 'ethanol',
  formula: 'C2H6O',
  casNumber: '64-17-5',
  molarMassGrams: '46,069',
  synonyms: 'ethyl alcohol; EtOH; ',
};
const issuesOf = (values: object) =>
  substanceSchema.safeParse({ ...ethanol, ...values }).error?.issues.map(({ path }) => path.join('.')) ?? [];

describe('the form of a substance', () => {
  it('goes to the service in kg/mol, with its synonyms parted', () => {
    const input = toInput(substanceSchema.parse(ethanol));
    expect(input.molarMass).toBeCloseTo(0.046069, 9);
    expect(input.synonyms).toEqual(['ethyl alcohol', 'EtOH']);
    expect(input.inchi).toBeNull();
  });

  it('sends a constant in the unit of its kind and its u as a part of the value', () => {
    const constant = {
      ...emptyConstant(),
      kind: 'NORMAL_BOILING_POINT',
      value: '351.44',
      relativePercent: '0.03',
      source: 'a handbook',
    };
    const [sent] = toInput(substanceSchema.parse({ ...ethanol, constants: [constant] })).constants ?? [];
    expect(sent).toMatchObject({
      kind: 'NORMAL_BOILING_POINT',
      value: 351.44,
      unit: 'K',
      source: 'a handbook',
      temperatureMinimum: null,
    });
    expect(sent?.relativeUncertainty).toBeCloseTo(0.0003, 12);
  });

  it('keeps equations as they were', () => {
    const equation = {
      __typename: 'SubstanceConstant' as const,
      kind: 'VAPOUR_PRESSURE' as const,
      label: 'Vapour pressure',
      symbol: 'p_sat',
      value: null,
      form: 'ANTOINE' as const,
      coefficients: [{ __typename: 'Coefficient' as const, symbol: 'A', value: 10.3 }],
      unit: 'Pa',
      temperatureMinimum: 276.5,
      temperatureMaximum: 369.54,
      relativeUncertainty: null,
      source: 'a handbook',
      note: null,
    };
    expect(toInput(substanceSchema.parse(ethanol), [equation]).constants).toEqual([
      {
        kind: 'VAPOUR_PRESSURE',
        form: 'ANTOINE',
        coefficients: [{ symbol: 'A', value: 10.3 }],
        unit: 'Pa',
        temperatureMinimum: 276.5,
        temperatureMaximum: 369.54,
        relativeUncertainty: null,
        source: 'a handbook',
        note: null,
      },
    ]);
  });

  it('is refused at the field that is wrong', () => {
    expect(issuesOf({ casNumber: '64-17-4' })).toEqual(['casNumber']);
    expect(issuesOf({ molarMassGrams: '0' })).toEqual(['molarMassGrams']);
    expect(issuesOf({ name: ' ' })).toEqual(['name']);
    expect(
      issuesOf({
        constants: [
          { ...emptyConstant(), value: '1', source: 's', temperatureMinimum: '400', temperatureMaximum: '300' },
        ],
      }),
    ).toEqual(['constants.0.temperatureMaximum']);
  });
});
