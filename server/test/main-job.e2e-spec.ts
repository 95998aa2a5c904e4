import { createHash } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import {
  ACCEPT_SERIES,
  acceptedSeries,
  type Actor,
  approved,
  type Crew,
  CREATE_SERIES,
  crewOf,
  done,
  DRAFT,
  drafted,
  fitted,
  Group,
  inReview,
  type Made,
  PASSWORD,
  pointsOf,
  problemsOf,
  RELEASE,
  released,
  REVIEW,
  SUBMIT_SERIES,
  SUBMIT_VERSION,
  UPDATE_DRAFT,
  WITHDRAW,
} from './actors.js';
import { fullerReference25, fullerReference53, polingTable11 } from './reference/helium-carbon-dioxide.js';

/** Only what stands in the public contract is asked for, as a program outside the project would. */
const CORRELATION = `form expression referenceTemperature referencePressure covariance degreesOfFreedom
  parameters { symbol value standardUncertainty unit }
  validity { temperatureMinimum temperatureMaximum pressureMinimum pressureMaximum pressureBasis }`;
const EVALUATE = `query ($T: FloatColumn!, $P: FloatColumn!, $kind: UncertaintyKind = MEAN, $outside: OutsideRange = FLAG,
    $coverage: Float = 0.95) {
  correlation(a: { name: "CO2" }, b: { casNumber: "7440-59-7" }) { ${CORRELATION}
    evaluate(temperatures: $T, pressures: $P, kind: $kind, outsideRange: $outside, coverage: $coverage) {
      diffusivities standardUncertainties expandedUncertainties coverageFactor outside } } }`;
const VERSION = `number status contentHash previousHash doi releasedAt withdrawnAt withdrawalReason
  supersededBy { number } preparedBy { id } reviewedBy { id } releasedBy { id }`;
const SHEET = `query ($code: String!, $number: String!) { dataSheet(code: $code) {
  current { number } versions { number status } version(number: $number) { ${VERSION} } } }`;

const PAIR = { a: { name: 'helium' }, b: { casNumber: '124-38-9' } };
const FULLER = 'Fuller, Schettler, Giddings, Ind. Eng. Chem. 58(5) (1966) 18, Table III';

/** A registration that fails is tried again after half a minute. */
const REGISTERED_WITHIN_MS = 75_000;

describe('the main job over HTTP alone', () => {
  let group: Group;
  let crew: Crew;
  let modeller: Actor;
  let pairId: string;
  let seriesIds: string[];
  let fit: Made;
  let first: Made;
  let second: Made;

  const evaluate = (variables: object) => group.visitor.ask(EVALUATE, variables).then((data) => data['correlation']);
  const sheetAt = (number: string) =>
    group.visitor.ask(SHEET, { code: first['sheet'].code, number }).then((data) => data['dataSheet']);
  const archived = (version: Made, extension: string) =>
    group.server.http.get(`/releases/${version['contentHash']}.${extension}`).buffer(true);

  beforeAll(async () => {
    group = await Group.start();
    crew = await crewOf(group);
    modeller = await group.join('modeller', 'MODELLER');
  });
  afterAll(() => group.stop());

  it('begins with a researcher who brings in the series of two laboratories', async () => {
    const bringIn = (title: string, points: typeof fullerReference25 | typeof fullerReference53) =>
      done(crew.researcher, CREATE_SERIES, {
        input: { ...PAIR, title, source: FULLER, method: 'as compiled', points: pointsOf(points) },
      });
    const series = [await bringIn('Reference 25', fullerReference25), await bringIn('Reference 53', fullerReference53)];
    seriesIds = series.map(({ id }) => id);
    pairId = series[0]!['pair'].id;

    expect(series.map(({ status }) => status)).toEqual(['DRAFT', 'DRAFT']);
    expect(series[1]!['pair'].id).toBe(pairId);
  });

  it('has each series accepted by an editor who did not submit it', async () => {
    expect(await problemsOf(crew.editor, ACCEPT_SERIES, { id: seriesIds[0] })).toEqual(['WRONG_STATE']);
    for (const id of seriesIds) await done(crew.researcher, SUBMIT_SERIES, { id });
    expect(await crew.researcher.codeOf(ACCEPT_SERIES, { id: seriesIds[0] })).toBe('FORBIDDEN');

    const both = await group.join('both', 'RESEARCHER', 'EDITOR');
    const own = await done(both, CREATE_SERIES, {
      input: { ...PAIR, title: 'Own', source: 'Invented', method: 'invented', points: pointsOf(polingTable11) },
    });
    await done(both, SUBMIT_SERIES, { id: own['id'] });
    expect(await problemsOf(both, ACCEPT_SERIES, { id: own['id'] })).toEqual(['NOT_INDEPENDENT']);

    for (const id of seriesIds) {
      expect(await done(crew.editor, ACCEPT_SERIES, { id })).toEqual({ id, status: 'ACCEPTED' });
    }
  });

  it('fits a correlation to the accepted series', async () => {
    fit = await fitted(crew.editor, pairId);
    expect(fit['series'].map((series: Made) => series['id'])).toEqual(seriesIds);
    expect(fit['statistics']).toMatchObject({ pointCount: 11, seriesCount: 2, betweenSeriesOrigin: 'ASSIGNED' });
    expect(fit['warnings'].map((warning: Made) => warning['code'])).toContain('ASSIGNED_DEVIATION');

    // Both laboratories' own values near 298 K, and the span of n usual for light gases (1.6 to 1.8).
    const [D0, n] = fit['correlation'].parameters;
    expect(D0).toMatchObject({ symbol: 'D0', unit: 'm2/s' });
    expect(Math.abs(D0.value / 6e-5 - 1)).toBeLessThan(0.05);
    expect(n.value).toBeGreaterThan(1.55);
    expect(n.value).toBeLessThan(1.85);
  });

  it('drafts version 1.0 from the fit', async () => {
    expect(await crew.researcher.codeOf(DRAFT, { input: { fitId: fit['id'], summary: 'x' } })).toBe('FORBIDDEN');
    expect(await problemsOf(crew.editor, DRAFT, { input: { fitId: fit['id'], summary: ' ' } })).toEqual([
      'BAD_INPUT summary',
    ]);
    first = await done(crew.editor, DRAFT, {
      input: { fitId: fit['id'], summary: 'Two laboratories, 276 K to 498 K.' },
    });
    expect(first).toMatchObject({ number: '1.0', status: 'DRAFT', sheet: { code: 'DS-0001' } });
    expect(await group.visitor.ask('{ dataSheets { totalCount } }')).toEqual({ dataSheets: { totalCount: 0 } });
    expect(await evaluate({ T: [300], P: [101_325] })).toBeNull();
  });

  it('has it reviewed by somebody who neither prepared it nor owns one of its series', async () => {
    const approval = { versionId: first['id'], verdict: 'APPROVE', remark: 'Reproduced.' };
    expect(await problemsOf(crew.reviewer, REVIEW, { input: approval })).toEqual(['WRONG_STATE']);
    await done(crew.editor, SUBMIT_VERSION, { id: first['id'] });
    expect(await problemsOf(crew.editor, REVIEW, { input: approval })).toEqual(['NOT_INDEPENDENT']);

    await group.server.sql("UPDATE people SET roles = '{RESEARCHER,EDITOR}' WHERE id = $1", [crew.researcher.id]);
    expect(await problemsOf(crew.researcher, REVIEW, { input: approval })).toEqual(['NOT_INDEPENDENT']);

    const reviewed = await done(crew.reviewer, REVIEW, { input: approval });
    expect(reviewed).toMatchObject({ status: 'APPROVED', reviewedBy: [{ id: crew.reviewer.id }] });
  });

  it('releases it with the password of somebody who did not prepare it', async () => {
    const subscribe = 'mutation ($id: ID!) { subscribeToSheet(sheetId: $id) { problems { code } } }';
    await modeller.ask(subscribe, { id: first['sheet'].id });
    const release = { id: first['id'], password: PASSWORD };
    expect(await problemsOf(crew.editor, RELEASE, release)).toEqual(['NOT_INDEPENDENT']);
    expect(await problemsOf(crew.reviewer, RELEASE, { ...release, password: 'not the password' })).toEqual([
      'WRONG_PASSWORD password',
    ]);
    first = await done(crew.reviewer, RELEASE, release);
    expect(first).toMatchObject({
      number: '1.0',
      status: 'RELEASED',
      previousHash: null,
      doi: expect.stringMatching(/^10\.\d{4,9}\/diffolio\.ds-0001\.v1\.0$/),
      releasedBy: { id: crew.reviewer.id },
    });
    expect(await problemsOf(crew.reviewer, RELEASE, release)).toEqual(['WRONG_STATE']);
  });

  it('lets a visitor’s program evaluate what its own arithmetic gives', async () => {
    const T = [280, 298.15, 333, 498];
    const P = [101_325, 50_000, 200_000, 101_325];
    const correlation = await evaluate({ T, P });
    const [[D0, n], [[v00, v01], [, v11]]] = [
      correlation.parameters.map((p: Made) => p['value']),
      correlation.covariance,
    ];
    const { referenceTemperature: T0, referencePressure: P0, evaluate: values } = correlation;

    // D = D0 (T/T0)^n (P0/P), and the law of propagation of uncertainty (JCGM 100:2008, 5.2.2).
    T.forEach((temperature, i) => {
      const logarithm = Math.log(temperature / T0);
      const D = D0 * (temperature / T0) ** n * (P0 / P[i]!);
      const relative = Math.sqrt(v00 / D0 ** 2 + (2 * logarithm * v01) / D0 + logarithm ** 2 * v11);
      expect(values.diffusivities[i] / D).toBeCloseTo(1, 12);
      expect(values.standardUncertainties[i] / (D * relative)).toBeCloseTo(1, 9);
      expect(values.expandedUncertainties[i] / (values.coverageFactor * values.standardUncertainties[i])).toBeCloseTo(
        1,
        12,
      );
    });
  });

  it('tells states outside the range and refuses them where asked to', async () => {
    const { evaluate: flagged } = await evaluate({ T: [300, 900, 100], P: [101_325] });
    expect(flagged.outside).toEqual([1, 2]);
    expect(await group.visitor.codeOf(EVALUATE, { T: [300, 900], P: [101_325], outside: 'REFUSE' })).toBe(
      'OUT_OF_RANGE',
    );
    const inside = await evaluate({ T: [300], P: [101_325], outside: 'REFUSE' });
    expect(inside.evaluate.outside).toEqual([]);
  });

  it('gives a new laboratory’s series a wider uncertainty than the mean', async () => {
    const mean = await evaluate({ T: [300], P: [101_325] });
    const prediction = await evaluate({ T: [300], P: [101_325], kind: 'NEW_SERIES' });
    expect(prediction.evaluate.standardUncertainties[0]).toBeGreaterThan(mean.evaluate.standardUncertainties[0]);
    expect(prediction.evaluate.diffusivities).toEqual(mean.evaluate.diffusivities);
  });

  it.each([
    ['no temperature', { T: [], P: [101_325] }],
    ['columns of unlike length', { T: [300, 310, 320], P: [101_325, 101_325] }],
    ['a temperature of 0 K', { T: [0], P: [101_325] }],
    ['a negative pressure', { T: [300], P: [-1] }],
    ['a text among the numbers', { T: [300, 'warm'], P: [101_325] }],
    ['a coverage of 1', { T: [300], P: [101_325], coverage: 1 }],
    ['more than 10,000 states', { T: Array.from({ length: 10_001 }, () => 300), P: [101_325] }],
  ])('answers BAD_USER_INPUT to %s', async (_, variables) => {
    expect(await group.visitor.codeOf(EVALUATE, variables)).toBe('BAD_USER_INPUT');
  });

  it('evaluates 10,000 states at once', async () => {
    const T = Array.from({ length: 10_000 }, (_, i) => 280 + i / 50);
    const { evaluate: values } = await evaluate({ T, P: [101_325] });
    expect(values.diffusivities).toHaveLength(10_000);
    expect(values.diffusivities.every((D: number, i: number, all: number[]) => i === 0 || D > all[i - 1]!)).toBe(true);
  });

  it('archives the release under the hash of its bytes', async () => {
    const json = await archived(first, 'json');
    expect(createHash('sha256').update(json.text).digest('hex')).toBe(first['contentHash']);
    const pdf = await archived(first, 'pdf');
    expect(pdf.headers['content-type']).toBe('application/pdf');
    expect(pdf.body.subarray(0, 5).toString()).toBe('%PDF-');
  });

  it('numbers a change of words alone as a revision and supersedes the version before', async () => {
    expect(await problemsOf(crew.editor, DRAFT, { input: { fitId: fit['id'], summary: 'Clearer.' } })).toEqual([
      'BAD_INPUT changeNote',
    ]);
    const revision = await released(crew, fit['id']);
    expect(revision).toMatchObject({ number: '1.1', previousHash: first['contentHash'] });
    const { current, version } = await sheetAt('1.0');
    expect(current.number).toBe('1.1');
    expect(version).toMatchObject({ status: 'SUPERSEDED', supersededBy: { number: '1.1' } });
    expect(version.contentHash).toBe(first['contentHash']);
  });

  it('numbers a change of the recommended values as a new edition', async () => {
    const input = {
      ...PAIR,
      title: 'Table 11-2',
      source: 'Poling, Prausnitz, O’Connell, 5th ed. (2001)',
      method: 'as compiled',
    };
    await acceptedSeries(crew, { ...input, points: pointsOf(polingTable11.map(([T, D]) => [T, D, 100_000])) });
    const changed = await fitted(crew.editor, pairId);
    expect(changed['statistics']).toMatchObject({ pointCount: 13, seriesCount: 3, betweenSeriesOrigin: 'STATED' });

    const abandoned = await drafted(crew.editor, fit['id']);
    expect(abandoned['number']).toBe('1.2');
    second = await released(crew, changed['id']);
    expect(second['number']).toBe('2.0');
    const { versions } = await sheetAt('2.0');
    expect(versions.filter((version: Made) => version['status'] !== 'DRAFT')).toEqual([
      { number: '2.0', status: 'RELEASED' },
      { number: '1.1', status: 'SUPERSEDED' },
      { number: '1.0', status: 'SUPERSEDED' },
    ]);
    const open = await crew.editor.ask('query ($id: ID!) { node(id: $id) { ... on DataSheetVersion { number } } }', {
      id: abandoned['id'],
    });
    expect(open['node'].number).toBe('3.0');
  });

  it('makes an edition of a narrower range in P stated by the editor', async () => {
    const changed = await group.server.sql<{ fit_id: string }>('SELECT fit_id FROM data_sheet_versions WHERE id = $1', [
      second['id'],
    ]);
    const draft = await drafted(crew.editor, changed[0]!.fit_id);
    expect(draft['number']).toBe('2.1');
    const stated = await done(crew.editor, UPDATE_DRAFT, {
      input: {
        versionId: draft['id'],
        lockVersion: draft['lockVersion'],
        summary: 'Narrower.',
        changeNote: 'A narrower range in P.',
        pressureRange: { minimum: 90_000, maximum: 110_000, reason: 'Invented for a test.' },
      },
    });
    expect(stated['number']).toBe('3.0');
  });

  it('withdraws a version with a reason and the password, and then none is current', async () => {
    const withdrawal = { id: second['id'], reason: 'Invented: a thermometer was off.', password: PASSWORD };
    expect(await problemsOf(crew.editor, WITHDRAW, { ...withdrawal, reason: ' ' })).toEqual(['BAD_INPUT reason']);
    expect(await problemsOf(crew.editor, WITHDRAW, { ...withdrawal, password: 'no' })).toEqual([
      'WRONG_PASSWORD password',
    ]);
    const withdrawn = await done(crew.editor, WITHDRAW, withdrawal);
    expect(withdrawn).toMatchObject({ status: 'WITHDRAWN', withdrawalReason: withdrawal.reason });

    const { current, version } = await sheetAt('2.0');
    expect(current).toBeNull();
    expect(version).toMatchObject({ status: 'WITHDRAWN', contentHash: second['contentHash'] });
    expect(await evaluate({ T: [300], P: [101_325] })).toBeNull();
    expect((await archived(second, 'json')).status).toBe(200);
    expect(await problemsOf(crew.editor, WITHDRAW, withdrawal)).toEqual(['WRONG_STATE']);
  });

  it('writes to whoever subscribed to the sheet, once for each release and withdrawal', async () => {
    const administrator = await group.join('administrator', 'ADMINISTRATOR');
    const letters = async () => {
      const answer = await group.server.http.get('/api/mail').set('Authorization', `Bearer ${administrator.token}`);
      return (answer.body as { to: string; subject: string }[]).filter(({ to }) => to === modeller.email);
    };
    await group.server.eventually(async () => ((await letters()).length >= 4 ? true : undefined), 25_000);
    expect(await letters()).toHaveLength(4);
  });

  it(
    'has the registrar confirm each DOI',
    async () => {
      const unconfirmed = () =>
        group.server.sql<object>(
          `SELECT FROM data_sheet_versions WHERE status IN ('RELEASED', 'SUPERSEDED', 'WITHDRAWN') AND doi_registered_at IS NULL`,
        );
      await group.server.eventually(
        async () => ((await unconfirmed()).length === 0 ? true : undefined),
        REGISTERED_WITHIN_MS,
      );
    },
    2 * REGISTERED_WITHIN_MS,
  );

  it('refuses a prediction for a new series where nothing is known of the scatter between series', async () => {
    const pooled = await fitted(crew.editor, pairId, { seriesEffect: 'POOLED' });
    const query = `query ($id: ID!) { fit(id: $id) { correlation {
      evaluate(temperatures: [300], pressures: [101325], kind: NEW_SERIES) { coverageFactor } } } }`;
    expect(await crew.editor.codeOf(query, { id: pooled['id'] })).toBe('NOT_AVAILABLE');
  });

  it('sends a version back with the reviewer’s remark, and it may come again', async () => {
    const version = await inReview(crew.editor, fit['id']);
    const verdict = { versionId: version['id'], verdict: 'RETURN' };
    expect(await problemsOf(crew.reviewer, REVIEW, { input: { ...verdict, remark: '' } })).toEqual([
      'BAD_INPUT remark',
    ]);
    const back = await done(crew.reviewer, REVIEW, { input: { ...verdict, remark: 'Say more of the range.' } });
    expect(back['status']).toBe('RETURNED');
    const again = await done(crew.editor, SUBMIT_VERSION, { id: version['id'] });
    expect(again['status']).toBe('IN_REVIEW');
  });

  it('approves nothing twice', async () => {
    const version = await approved(crew, fit['id']);
    const approval = { versionId: version['id'], verdict: 'APPROVE', remark: '' };
    expect(await problemsOf(crew.reviewer, REVIEW, { input: approval })).toEqual(['WRONG_STATE']);
  });
});
