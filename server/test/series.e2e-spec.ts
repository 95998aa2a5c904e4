import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import {
  ACCEPT_SERIES,
  acceptedSeries,
  type Actor,
  CREATE_SERIES,
  type Crew,
  crewOf,
  done,
  draftSeries,
  Group,
  type Made,
  pointsOf,
  problemsOf,
  RETIRE_SERIES,
  RETURN_SERIES,
  SERIES_INPUT,
  SUBMIT_SERIES,
  submittedSeries,
  UPDATE_SERIES,
} from './actors.js';

const POINT = { temperature: 300, pressure: 101_325, diffusivity: 7e-5, diffusivityUncertainty: 1e-6 };
const ONE = `query ($id: ID!) { node(id: $id) { ... on Series { status title apparatus dataOrigin commonRelativeUncertainty
  pair { substances { name } } sameDataAs { id } submittedBy { id } warnings { code path }
  points { id temperature pressure pressureOrigin diffusivity diffusivityUncertainty uncertaintyOrigin temperatureUncertainty
    pressureUncertainty moleFraction replicates } } } }`;

describe('series', () => {
  let group: Group;
  let crew: Crew;
  let researcher: Actor;

  beforeAll(async () => {
    group = await Group.start();
    crew = await crewOf(group);
    ({ researcher } = crew);
  });
  afterAll(() => group.stop());

  const create = (input: object) => ({ input: { ...SERIES_INPUT, ...input } });
  const withPoint = (fault: object) => create({ points: [POINT, { ...POINT, ...fault }] });
  const read = async (id: string) => (await researcher.ask(ONE, { id }))['node'];
  const countSeries = async () => (await group.server.sql<{ count: string }>('SELECT count(*) FROM series'))[0]!.count;

  it('keeps what was given, and shows the pair in the order first named', async () => {
    const full = {
      ...POINT,
      pressureOrigin: 'REDUCED_BY_SOURCE',
      temperatureUncertainty: 0.05,
      pressureUncertainty: 20,
      moleFraction: 0.5,
      replicates: 3,
    };
    const { id } = await draftSeries(researcher, {
      a: { name: 'HELIUM' },
      b: { casNumber: '7440-37-1' },
      apparatus: 'tube 4',
      dataOrigin: 'GRAPH',
      commonRelativeUncertainty: 0.01,
      points: [full],
    });
    expect(await read(id)).toEqual({
      status: 'DRAFT',
      title: SERIES_INPUT.title,
      apparatus: 'tube 4',
      dataOrigin: 'GRAPH',
      commonRelativeUncertainty: 0.01,
      pair: { substances: [{ name: 'helium' }, { name: 'argon' }] },
      sameDataAs: null,
      submittedBy: null,
      warnings: [],
      points: [{ id: expect.any(String), ...full, uncertaintyOrigin: 'STATED' }],
    });
  });

  it('assigns the usual uncertainty of the method where none is stated, and says so', async () => {
    const { temperature, pressure, diffusivity } = POINT;
    const { id } = await draftSeries(researcher, {
      method: 'unheard of',
      points: [{ temperature, pressure, diffusivity }],
    });
    const series = await read(id);
    expect(series['points'][0]).toMatchObject({ uncertaintyOrigin: 'ASSIGNED', pressureOrigin: 'STATED' });
    expect(series['points'][0].diffusivityUncertainty).toBeCloseTo(0.05 * diffusivity, 12);
    expect(series['warnings']).toEqual([{ code: 'UNCERTAINTY_ASSIGNED', path: 'points' }]);
  });

  it('warns of a repeated row and refuses it not; the same T and P with another D is a replicate', async () => {
    const { id } = await draftSeries(researcher, { points: [POINT, POINT, { ...POINT, diffusivity: 7.1e-5 }] });
    expect((await read(id))['warnings']).toEqual([{ code: 'DUPLICATE_POINT', path: 'points.1' }]);
  });

  it.each([
    ['no title', create({ title: ' ' }), 'BAD_INPUT title'],
    ['no source', create({ source: '' }), 'BAD_INPUT source'],
    ['no method', create({ method: '' }), 'BAD_INPUT method'],
    ['no points', create({ points: [] }), 'BAD_INPUT points'],
    ['a substance that is not in the library', create({ a: { name: 'unobtainium' } }), 'BAD_INPUT a'],
    ['a second substance that is not there', create({ b: { id: 'nothing' } }), 'BAD_INPUT b'],
    ['one substance twice', create({ b: { name: 'Ar' } }), 'BAD_INPUT b'],
    ['a common uncertainty of 100 %', create({ commonRelativeUncertainty: 1 }), 'BAD_INPUT commonRelativeUncertainty'],
    ['data of a series that is not there', create({ sameDataAsId: 'nothing' }), 'BAD_INPUT sameDataAsId'],
    ['a temperature of 0 K', withPoint({ temperature: 0 }), 'BAD_INPUT points.1.temperature'],
    ['a negative pressure', withPoint({ pressure: -1 }), 'BAD_INPUT points.1.pressure'],
    ['a diffusivity of 0', withPoint({ diffusivity: 0 }), 'BAD_INPUT points.1.diffusivity'],
    ['an uncertainty of 0', withPoint({ diffusivityUncertainty: 0 }), 'BAD_INPUT points.1.diffusivityUncertainty'],
    ['a negative u(T)', withPoint({ temperatureUncertainty: -1 }), 'BAD_INPUT points.1.temperatureUncertainty'],
    ['a negative u(P)', withPoint({ pressureUncertainty: -1 }), 'BAD_INPUT points.1.pressureUncertainty'],
    ['a mole fraction over 1', withPoint({ moleFraction: 1.2 }), 'BAD_INPUT points.1.moleFraction'],
    ['no replicates', withPoint({ replicates: 0 }), 'BAD_INPUT points.1.replicates'],
  ])('refuses %s at its field and keeps nothing', async (_, variables, expected) => {
    const before = await countSeries();
    expect(await problemsOf(researcher, CREATE_SERIES, variables)).toEqual([expected]);
    expect(await countSeries()).toBe(before);
  });

  it('names every fault at once', async () => {
    const points = [{ ...POINT, temperature: -1, pressure: 0 }];
    expect(await problemsOf(researcher, CREATE_SERIES, create({ title: '', points }))).toEqual([
      'BAD_INPUT title',
      'BAD_INPUT points.0.temperature',
      'BAD_INPUT points.0.pressure',
    ]);
  });

  it('refuses what is no number and more than one name of a substance before it runs', async () => {
    expect(await researcher.codeOf(CREATE_SERIES, withPoint({ temperature: 'warm' }))).toBe('BAD_USER_INPUT');
    const two = create({ a: { name: 'argon', casNumber: '7440-37-1' } });
    expect(await researcher.codeOf(CREATE_SERIES, two)).toBe('BAD_USER_INPUT');
  });

  it('takes 10,000 points at once and no more', async () => {
    // In pieces of the body's limit: the points as short as JSON allows.
    const points = Array.from({ length: 10_001 }, (_, i) => ({
      temperature: 300 + i,
      pressure: 1e5,
      diffusivity: 7e-5,
    }));
    expect(await problemsOf(researcher, CREATE_SERIES, create({ points }))).toEqual(['BAD_INPUT points']);
    const { id } = await draftSeries(researcher, { points: points.slice(1) });
    const [row] = await group.server.sql<{ count: number }>(
      'SELECT count(*)::int FROM series_points WHERE series_id = $1',
      [id],
    );
    expect(row!.count).toBe(10_000);
  });

  describe('move from hand to hand', () => {
    it('submitted, returned with a remark, mended, submitted again, accepted, retired', async () => {
      const { id } = await submittedSeries(researcher);
      expect(await problemsOf(researcher, SUBMIT_SERIES, { id })).toEqual(['WRONG_STATE']);
      expect(await problemsOf(crew.editor, RETURN_SERIES, { id, remark: ' ' })).toEqual(['BAD_INPUT remark']);
      const back = await done(crew.editor, RETURN_SERIES, { id, remark: 'Which vapour-pressure equation?' });
      expect(back).toEqual({ id, status: 'RETURNED' });
      expect(await problemsOf(crew.editor, ACCEPT_SERIES, { id })).toEqual(['WRONG_STATE']);

      const { a: _a, b: _b, ...header } = SERIES_INPUT;
      const mended = { ...header, id, lockVersion: 3, title: 'Mended' };
      expect(await researcher.codeOf(UPDATE_SERIES, { input: { ...mended, lockVersion: 1 } })).toBe('CONFLICT');
      expect(await done(researcher, UPDATE_SERIES, { input: mended })).toMatchObject({
        status: 'DRAFT',
        title: 'Mended',
      });
      await done(researcher, SUBMIT_SERIES, { id });
      await done(crew.editor, ACCEPT_SERIES, { id });
      expect(await problemsOf(researcher, UPDATE_SERIES, { input: { ...mended, lockVersion: 6 } })).toEqual([
        'WRONG_STATE',
      ]);
      expect(await problemsOf(crew.editor, RETURN_SERIES, { id, remark: 'Late.' })).toEqual(['WRONG_STATE']);
      expect(await problemsOf(crew.editor, RETIRE_SERIES, { id, remark: '' })).toEqual(['BAD_INPUT remark']);
      expect(await done(crew.editor, RETIRE_SERIES, { id, remark: 'The tube was bent.' })).toMatchObject({
        status: 'RETIRED',
      });

      const events = 'query ($id: ID!) { node(id: $id) { ... on Series { events { action remark person { id } } } } }';
      expect((await researcher.ask(events, { id }))['node'].events).toEqual(
        [
          ['create', null, researcher],
          ['submit', null, researcher],
          ['return', 'Which vapour-pressure equation?', crew.editor],
          ['change', null, researcher],
          ['submit', null, researcher],
          ['accept', null, crew.editor],
          ['retire', 'The tube was bent.', crew.editor],
        ].map(([action, remark, person]) => ({ action, remark, person: { id: (person as Actor).id } })),
      );
    });

    it('only by their owner or an editor, and unseen drafts are not there for others', async () => {
      const other = await group.join('other', 'RESEARCHER');
      const draft = await draftSeries(researcher);
      expect(await other.codeOf(SUBMIT_SERIES, { id: draft['id'] })).toBe('NOT_FOUND');
      expect(await crew.editor.codeOf(SUBMIT_SERIES, { id: 'nothing' })).toBe('NOT_FOUND');
      const submitted = await submittedSeries(researcher);
      expect(await other.codeOf(SUBMIT_SERIES, { id: submitted['id'] })).toBe('FORBIDDEN');
      expect(await researcher.codeOf(RETURN_SERIES, { id: submitted['id'], remark: 'x' })).toBe('FORBIDDEN');
    });

    it('by nobody without the role', async () => {
      const modeller = await group.join('modeller', 'MODELLER');
      const administrator = await group.join('administrator', 'ADMINISTRATOR');
      expect(await group.visitor.codeOf(CREATE_SERIES, create({}))).toBe('UNAUTHENTICATED');
      expect(await modeller.codeOf(CREATE_SERIES, create({}))).toBe('FORBIDDEN');
      expect(await administrator.codeOf(CREATE_SERIES, create({}))).toBe('FORBIDDEN');
    });
  });

  describe('that repeat the data of another', () => {
    it('name it, within one pair', async () => {
      const first = await acceptedSeries(crew);
      const again = await draftSeries(researcher, { sameDataAsId: first['id'] });
      expect((await read(again['id']))['sameDataAs']).toEqual({ id: first['id'] });
      const elsewhere = create({ b: { name: 'neon' }, sameDataAsId: first['id'] });
      expect(await problemsOf(researcher, CREATE_SERIES, elsewhere)).toEqual(['BAD_INPUT sameDataAsId']);
    });

    it('never repeat themselves, not even through others', async () => {
      const { a: _a, b: _b, points: _points, ...header } = SERIES_INPUT;
      const first = await draftSeries(researcher);
      const second = await draftSeries(researcher, { sameDataAsId: first['id'] });
      const third = await draftSeries(researcher, { sameDataAsId: second['id'] });
      for (const sameDataAsId of [first['id'], second['id'], third['id']]) {
        const input = { ...header, id: first['id'], lockVersion: first['lockVersion'], sameDataAsId };
        expect(await problemsOf(researcher, UPDATE_SERIES, { input })).toEqual(['BAD_INPUT sameDataAsId']);
      }
    });
  });

  it('come in pages whose cursors lead on, whole and without repeats', async () => {
    for (const [T, D] of [
      [300, 4e-5],
      [310, 4.2e-5],
      [320, 4.5e-5],
    ] as const) {
      await draftSeries(researcher, { b: { name: 'krypton' }, title: `${T}`, points: pointsOf([[T, D]]) });
    }
    const query = `query ($first: Int, $after: String) { pair(a: { name: "argon" }, b: { name: "krypton" }) {
      series(first: $first, after: $after) { totalCount pageInfo { hasNextPage hasPreviousPage startCursor endCursor }
        edges { cursor node { title } } } } }`;
    const page = async (variables: object) => (await researcher.ask(query, variables))['pair'].series;
    const one = await page({ first: 2 });
    expect(one['edges'].map((edge: Made) => edge['node'].title)).toEqual(['300', '310']);
    expect(one['pageInfo']).toEqual({
      hasNextPage: true,
      hasPreviousPage: false,
      startCursor: one['edges'][0].cursor,
      endCursor: one['edges'][1].cursor,
    });
    const two = await page({ first: 2, after: one['pageInfo'].endCursor });
    expect(two['edges'].map((edge: Made) => edge['node'].title)).toEqual(['320']);
    expect(two['pageInfo']).toMatchObject({ hasNextPage: false, hasPreviousPage: true });
    expect(await page({ first: 0 })).toMatchObject({ totalCount: 3, edges: [], pageInfo: { hasNextPage: true } });
    expect(await page({})).toMatchObject({ totalCount: 3 });
    expect(await researcher.codeOf(query, { first: -1 })).toBe('BAD_USER_INPUT');
    expect(await researcher.codeOf(query, { first: 101 })).toBe('BAD_USER_INPUT');
    expect(await researcher.codeOf(query, { first: 2, after: 'a page of ours?' })).toBe('BAD_USER_INPUT');
  });
});
