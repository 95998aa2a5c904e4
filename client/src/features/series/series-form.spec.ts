import { describe, expect, it } from 'vitest';
import { type SeriesDetailFragment } from '../../gql/graphql';
import { defaultUnits, type ReaderUnits } from '../../lib/units';
import { emptyPoint, seriesFields, seriesFormSchema, updateInput } from './series-form';

const point = {
  id: 'p1',
  temperature: 298.15,
  pressure: 101_325,
  pressureOrigin: 'STATED',
  diffusivity: 1.2345678912e-5,
  diffusivityUncertainty: 1.5e-7,
  uncertaintyOrigin: 'STATED',
  temperatureUncertainty: 0.05,
  pressureUncertainty: null,
  moleFraction: null,
  replicates: 3,
} as const satisfies SeriesDetailFragment['points'][number];

const series: SeriesDetailFragment = {
  id: 's1',
  ordinal: 0,
  file: null,
  title: 'Laboratory A',
  status: 'RETURNED',
  source: 'notebook 4',
  method: 'evaporation tube',
  apparatus: null,
  dataOrigin: 'TABLE',
  commonRelativeUncertainty: 0.012,
  createdAt: '2026-11-01T00:00:00Z',
  lockVersion: 3,
  createdBy: null,
  submittedBy: null,
  sameDataAs: null,
  pair: { id: 'g1', substances: [] },
  warnings: [],
  events: [],
  points: [point, { ...point, id: 'p2', temperature: 310, uncertaintyOrigin: 'ASSIGNED' }],
};
const celsius: ReaderUnits = { temperature: 'degC', pressure: 'bar', diffusivity: 'mm2_s' };

describe('the form of a series', () => {
  it('shows stored numbers in the reader’s units, and leaves an assigned u(D) to be assigned anew', () => {
    const { points, common } = seriesFields(series, celsius);
    expect(points[0]).toEqual({
      id: 'p1',
      temperature: '25',
      pressure: '1.01325',
      diffusivity: '12.345679',
      uncertainty: '0.15',
    });
    expect(points[1]?.uncertainty).toBe('');
    expect(common).toBe('1.2');
  });

  it('sends no points where only the header changed', () => {
    const fields = { ...seriesFields(series, celsius), title: 'Laboratory A, corrected' };
    expect(updateInput(series, fields, celsius)).toMatchObject({
      title: 'Laboratory A, corrected',
      lockVersion: 3,
      commonRelativeUncertainty: 0.012,
      points: null,
    });
  });

  it('keeps every number that was not touched to its last digit', () => {
    const fields = seriesFields(series, celsius);
    fields.points[1] = { ...fields.points[1]!, temperature: '40' };
    const { points } = updateInput(series, fields, celsius);
    expect(points?.[0]).toMatchObject({
      temperature: 298.15,
      diffusivity: 1.2345678912e-5,
      diffusivityUncertainty: 1.5e-7,
      temperatureUncertainty: 0.05,
      replicates: 3,
    });
    expect(points?.[1]).toMatchObject({
      temperature: 313.15,
      diffusivity: 1.2345678912e-5,
      diffusivityUncertainty: null,
    });
  });

  it('takes a new point in the reader’s units, decimal commas included', () => {
    const fields = seriesFields(series, celsius);
    fields.points.push({ ...emptyPoint, temperature: '50', pressure: '1', diffusivity: '14,5' });
    expect(updateInput(series, fields, celsius).points?.[2]).toMatchObject({
      temperature: 323.15,
      pressure: 1e5,
      diffusivity: 1.45e-5,
      pressureOrigin: 'STATED',
    });
  });

  it('refuses text in a number, absolute zero, and a series without points', () => {
    const fields = seriesFields(series, defaultUnits);
    const messages = (points: typeof fields.points) =>
      seriesFormSchema(defaultUnits)
        .safeParse({ ...fields, points })
        .error?.issues.map(({ path }) => path.join('.'));
    expect(messages([{ ...fields.points[0]!, diffusivity: 'about 0.1' }])).toEqual(['points.0.diffusivity']);
    expect(messages([{ ...fields.points[0]!, temperature: '0' }])).toEqual(['points.0.temperature']);
    expect(messages([])).toEqual(['points']);
  });
});
