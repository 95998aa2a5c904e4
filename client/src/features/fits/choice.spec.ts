import { describe, expect, it } from 'vitest';
import { type FitSeriesFragment, type KeptFitFragment } from '../../gql/graphql';
import { choiceOfFit, choiceReducer, firstChoice, fitInput, isSameChoice } from './choice';
import { usualRecipe } from './recipe';

const series = (id: string, more: Partial<FitSeriesFragment> = {}): FitSeriesFragment => ({
  id,
  ordinal: 0,
  title: `Laboratory ${id}`,
  status: 'ACCEPTED',
  source: 'notebook',
  method: 'two-bulb cell',
  apparatus: null,
  commonRelativeUncertainty: null,
  sameDataAs: null,
  submittedBy: null,
  points: [1, 2].map((n) => ({
    id: `${id}.${n}`,
    temperature: 290 + 10 * n,
    pressure: 101_325,
    diffusivity: 1e-5,
    diffusivityUncertainty: 1e-7,
    uncertaintyOrigin: 'STATED',
  })),
  ...more,
});

const all = [series('A'), series('B'), series('C', { status: 'SUBMITTED' })];

describe('what is chosen for a fit', () => {
  it('begins with every accepted series and no other', () => {
    const input = fitInput(firstChoice(all), 'pair', all);
    expect(input).toMatchObject({ pairId: 'pair', seriesIds: ['A', 'B'], leftOutSeries: [], excludedPoints: [] });
  });

  it('leaves out the series that repeats another, and says which', () => {
    const repeating = [series('A'), series('B', { sameDataAs: { id: 'A', title: 'Laboratory A' } })];
    expect(firstChoice(repeating).seriesOut).toEqual({ B: 'duplicate: repeats the data of Laboratory A' });
  });

  it('leaves a series out with its reason, and takes it in again', () => {
    const out = choiceReducer(firstChoice(all), { type: 'leaveOutSeries', id: 'B', reason: 'apparatus: leak' });
    expect(fitInput(out, 'pair', all)).toMatchObject({
      seriesIds: ['A'],
      leftOutSeries: [{ seriesId: 'B', reason: 'apparatus: leak' }],
    });
    expect(choiceReducer(out, { type: 'takeInSeries', id: 'B' })).toEqual(firstChoice(all));
  });

  it('leaves nothing out without a reason', () => {
    expect(choiceReducer(firstChoice(all), { type: 'leaveOutPoint', id: 'A.1', reason: '  ' })).toEqual(
      firstChoice(all),
    );
  });

  it('sends points left out of series that are in, and keeps those of series that are out for later', () => {
    const point = choiceReducer(firstChoice(all), { type: 'leaveOutPoint', id: 'B.2', reason: 'disturbed: door open' });
    expect(fitInput(point, 'pair', all)?.excludedPoints).toEqual([{ pointId: 'B.2', reason: 'disturbed: door open' }]);
    const both = choiceReducer(point, { type: 'leaveOutSeries', id: 'B', reason: 'other: under repair' });
    expect(fitInput(both, 'pair', all)?.excludedPoints).toEqual([]);
    expect(both.pointsOut).toEqual(point.pointsOut);
  });

  it('brings K, kPa and percent to SI', () => {
    const recipe = { ...usualRecipe, referenceTemperature: '300', referencePressure: '100', betweenSeries: '2,5' };
    const input = fitInput({ ...firstChoice(all), recipe }, 'pair', all);
    expect(input).toMatchObject({
      referenceTemperature: 300,
      referencePressure: 100_000,
      betweenSeriesDeviation: 0.025,
    });
  });

  it('is no input while the recipe cannot be read or no series is in', () => {
    expect(
      fitInput({ ...firstChoice(all), recipe: { ...usualRecipe, referenceTemperature: 'warm' } }, 'pair', all),
    ).toBeNull();
    expect(fitInput(firstChoice([]), 'pair', [])).toBeNull();
  });

  it('of a kept fit leads to the same fit again; series accepted since are in', () => {
    const fit = {
      objective: 'LN_DIFFUSIVITY',
      weighting: 'STATED',
      loss: 'LEAST_SQUARES',
      seriesEffect: 'RANDOM_INTERCEPT',
      correlation: { form: 'POWER_LAW', referenceTemperature: 298.15, referencePressure: 101_325 },
      statistics: { seriesCount: 2, betweenSeriesOrigin: 'ASSIGNED', betweenSeriesDeviation: 0.03 },
      leftOutSeries: [{ reason: 'apparatus: leak', series: { id: 'B' } }],
      excludedPoints: [{ reason: 'other: typing', point: { id: 'A.1' } }],
    } as unknown as KeptFitFragment;
    const choice = choiceOfFit(fit);
    expect(fitInput(choice, 'pair', [...all, series('D')])).toMatchObject({
      form: 'POWER_LAW',
      weighting: 'STATED',
      seriesEffect: 'RANDOM_INTERCEPT',
      betweenSeriesDeviation: 0.03,
      referencePressure: 101_325,
      seriesIds: ['A', 'D'],
      leftOutSeries: [{ seriesId: 'B', reason: 'apparatus: leak' }],
      excludedPoints: [{ pointId: 'A.1', reason: 'other: typing' }],
    });
    expect(isSameChoice(choice, choiceOfFit(fit))).toBe(true);
    expect(isSameChoice(choice, choiceReducer(choice, { type: 'takeInPoint', id: 'A.1' }))).toBe(false);
  });
});
