import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import {
  acceptedSeries,
  type Crew,
  crewOf,
  draftSeries,
  FIT,
  fitted,
  Group,
  INVENTED_POINTS,
  type Made,
  type Point,
  pointsOf,
  problemsOf,
} from './actors.js';
import { fullerReference25, fullerReference53, polingTable11 } from './reference/helium-carbon-dioxide.js';

const NOWHERE = '00000000-0000-4000-8000-000000000000';
const codes = (warnings: Made[]) => warnings.map((warning) => warning['code'] as string);

describe('fits', () => {
  let group: Group;
  let crew: Crew;
  let series: Made[];
  let pairId: string;

  /** Accepted series of argon with a gas no other test here takes. */
  const alone = async (gas: string, points: readonly Point[]) =>
    (await acceptedSeries(crew, { b: { name: gas }, points: pointsOf(points) }))['pair'].id as string;
  const problems = (input: object) => problemsOf(crew.editor, FIT, { input: { pairId, form: 'POWER_LAW', ...input } });
  const countFits = async () => (await group.server.sql<{ count: string }>('SELECT count(*) FROM fits'))[0]!.count;

  beforeAll(async () => {
    group = await Group.start();
    crew = await crewOf(group);
    const pair = { a: { name: 'helium' }, b: { name: 'carbon dioxide' } };
    series = [];
    for (const [title, points] of [
      ['25', fullerReference25],
      ['53', fullerReference53],
      ['Table 11-2', polingTable11],
    ] as const) {
      series.push(await acceptedSeries(crew, { ...pair, title, points: pointsOf(points) }));
    }
    pairId = series[0]!['pair'].id;
  });
  afterAll(() => group.stop());

  it('estimate the deviation between three series and assign it for fewer, with a warning', async () => {
    const three = await fitted(crew.researcher, pairId);
    expect(three['statistics']).toMatchObject({ pointCount: 13, seriesCount: 3, betweenSeriesOrigin: 'STATED' });
    expect(codes(three['warnings'])).not.toContain('ASSIGNED_DEVIATION');

    const two = await fitted(crew.researcher, pairId, { seriesIds: [series[0]!['id'], series[1]!['id']] });
    expect(two['statistics'].betweenSeriesOrigin).toBe('ASSIGNED');
    // The group's own deviation, from its only fit of three series.
    expect(two['statistics'].betweenSeriesDeviation).toBeCloseTo(three['statistics'].betweenSeriesDeviation, 12);
    expect(two['warnings']).toContainEqual(
      expect.objectContaining({ code: 'ASSIGNED_DEVIATION', path: 'betweenSeriesDeviation' }),
    );

    const given = await fitted(crew.researcher, pairId, { betweenSeriesDeviation: 0.02 });
    expect(given['statistics']).toMatchObject({ betweenSeriesDeviation: 0.02, betweenSeriesOrigin: 'ASSIGNED' });
  });

  it('leave out points with their reasons', async () => {
    const points = `query ($id: ID!) { node(id: $id) { ... on Series { points { id } } } }`;
    const [, second] = (await crew.editor.ask(points, { id: series[1]!['id'] }))['node'].points as Made[];
    const reason = 'Invented: a leak.';
    const exclusion = { pointId: second!['id'], reason };
    const fit = await fitted(crew.editor, pairId, { excludedPoints: [exclusion, exclusion] });
    expect(fit['statistics'].pointCount).toBe(12);
    expect(fit['excludedPoints']).toEqual([{ reason, point: { id: second!['id'] }, series: { id: series[1]!['id'] } }]);
    expect(await problems({ excludedPoints: [{ ...exclusion, reason: ' ' }] })).toEqual([
      'BAD_INPUT excludedPoints.0.reason',
    ]);
    expect(await problems({ excludedPoints: [exclusion], seriesIds: [series[0]!['id']] })).toEqual([
      'BAD_INPUT excludedPoints.0.pointId',
    ]);
  });

  it.each([
    [
      'a point that is not there',
      { excludedPoints: [{ pointId: `${NOWHERE}:0`, reason: 'x' }] },
      'BAD_INPUT excludedPoints.0.pointId',
    ],
    [
      'an id that is no point’s',
      { excludedPoints: [{ pointId: 'nothing', reason: 'x' }] },
      'BAD_INPUT excludedPoints.0.pointId',
    ],
    ['a series that is not there', { seriesIds: [NOWHERE] }, 'BAD_INPUT seriesIds.0'],
    ['no series', { seriesIds: [] }, 'BAD_INPUT seriesIds'],
    ['a negative deviation', { betweenSeriesDeviation: -0.1 }, 'BAD_INPUT betweenSeriesDeviation'],
    ['a reference temperature of 0 K', { referenceTemperature: 0 }, 'BAD_INPUT referenceTemperature'],
    ['a negative reference pressure', { referencePressure: -1 }, 'BAD_INPUT referencePressure'],
    ['a robust loss with random effects', { loss: 'HUBER' }, 'BAD_INPUT loss'],
    ['the form SUTHERLAND', { form: 'SUTHERLAND' }, 'NOT_AVAILABLE form'],
    ['the form LOG_QUADRATIC', { form: 'LOG_QUADRATIC' }, 'NOT_AVAILABLE form'],
    ['the form THREE_TERM', { form: 'THREE_TERM' }, 'NOT_AVAILABLE form'],
    ['the form KINETIC_THEORY', { form: 'KINETIC_THEORY' }, 'NOT_AVAILABLE form'],
    ['m from one pressure', { form: 'POWER_LAW_FREE_PRESSURE' }, 'NOT_DETERMINABLE'],
  ])('refuse %s and keep nothing', async (_, input, expected) => {
    const before = await countFits();
    expect(await problems(input)).toEqual([expected]);
    expect(await countFits()).toBe(before);
  });

  it('refuse n from one temperature, and two parameters from two points', async () => {
    const oneTemperature = await alone('neon', [
      [300, 3.2e-5],
      [300, 3.21e-5],
      [300, 3.22e-5],
    ]);
    expect(await problems({ pairId: oneTemperature })).toEqual(['NOT_DETERMINABLE']);
    const twoPoints = await alone('krypton', [
      [300, 1.4e-5],
      [400, 2.3e-5],
    ]);
    expect(await problems({ pairId: twoPoints })).toEqual(['NOT_DETERMINABLE']);
  });

  it('find m where pressures differ', async () => {
    // Invented: D = 7.4e-5 m²/s (T/298.15 K)^1.7 (101 325 Pa/P)^1.
    const at = (T: number, P: number): Point => [T, 7.4e-5 * (T / 298.15) ** 1.7 * (101_325 / P), P];
    const points = [at(290, 5e4), at(310, 1e5), at(340, 2e5), at(370, 5e4), at(400, 1e5), at(420, 2e5)];
    const pair = await alone('hydrogen', points);
    const fit = await fitted(crew.editor, pair, { form: 'POWER_LAW_FREE_PRESSURE', seriesEffect: 'POOLED' });
    const values = fit['correlation'].parameters.map((parameter: Made) => parameter['value']);
    expect(values[0] / 7.4e-5).toBeCloseTo(1, 9);
    expect(values[1]).toBeCloseTo(1.7, 9);
    expect(values[2]).toBeCloseTo(1, 9);
  });

  it('take accepted series only', async () => {
    const draft = await draftSeries(crew.researcher, { b: { name: 'xenon' } });
    const xenon = draft['pair'].id;
    expect(await problems({ pairId: xenon })).toEqual(['BAD_INPUT seriesIds']);
    expect(await problems({ pairId: xenon, seriesIds: [draft['id']] })).toEqual(['WRONG_STATE seriesIds.0']);
    expect(await problems({ seriesIds: [draft['id']] })).toEqual(['BAD_INPUT seriesIds.0']);
  });

  it('answer NOT_FOUND for a pair that is not there', async () => {
    for (const id of ['nothing', NOWHERE]) {
      expect(await crew.editor.codeOf(FIT, { input: { pairId: id, form: 'POWER_LAW' } })).toBe('NOT_FOUND');
    }
  });

  it('give weight to only one of those that hold the same data', async () => {
    const pair = { b: { name: 'oxygen' }, points: pointsOf(INVENTED_POINTS) };
    const origin = await acceptedSeries(crew, { ...pair, title: 'origin' });
    const repeat = await acceptedSeries(crew, { ...pair, title: 'repeat', sameDataAsId: origin['id'] });
    const repeatOfRepeat = await acceptedSeries(crew, { ...pair, title: 'again', sameDataAsId: repeat['id'] });
    const oxygen = origin['pair'].id;

    const all = await fitted(crew.editor, oxygen);
    expect(all['series']).toEqual([{ id: origin['id'] }]);
    const chosen = await fitted(crew.editor, oxygen, { seriesIds: [repeatOfRepeat['id']] });
    expect(chosen['series']).toEqual([{ id: repeatOfRepeat['id'] }]);
    for (const pairOfThem of [
      [origin, repeat],
      [origin, repeatOfRepeat],
      [repeat, repeatOfRepeat],
    ]) {
      const seriesIds = pairOfThem.map((one) => one['id']);
      expect(await problems({ pairId: oxygen, seriesIds })).toEqual(['BAD_INPUT seriesIds']);
    }
  });

  it('are shown without being kept, where only looked at', async () => {
    const query = `query ($input: FitCorrelationInput!) { previewFit(input: $input) {
      analysis { correlation { parameters { symbol value } } series { series { id } carriesWeight } } problems { code path } } }`;
    const before = await countFits();
    const input = { pairId, form: 'POWER_LAW', seriesIds: [series[0]!['id'], series[1]!['id']] };
    const { analysis, problems: none } = (await crew.researcher.ask(query, { input }))['previewFit'];
    expect(none).toEqual([]);
    expect(analysis.series).toEqual([
      { series: { id: series[0]!['id'] }, carriesWeight: true },
      { series: { id: series[1]!['id'] }, carriesWeight: true },
      { series: { id: series[2]!['id'] }, carriesWeight: false },
    ]);
    const refused = await crew.researcher.ask(query, { input: { ...input, form: 'SUTHERLAND' } });
    expect(refused['previewFit']).toEqual({ analysis: null, problems: [{ code: 'NOT_AVAILABLE', path: 'form' }] });
    expect(await countFits()).toBe(before);
  });

  it('are for researchers and editors', async () => {
    const modeller = await group.join('modeller', 'MODELLER');
    const input = { pairId, form: 'POWER_LAW' };
    expect(await modeller.codeOf(FIT, { input })).toBe('FORBIDDEN');
    expect(await group.visitor.codeOf(FIT, { input })).toBe('UNAUTHENTICATED');
  });
});
