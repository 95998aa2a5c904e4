import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import {
  acceptedSeries,
  type Actor,
  approved,
  crewOf,
  type Crew,
  done,
  drafted,
  draftSeries,
  fitted,
  Group,
  inReview,
  type Made,
  PASSWORD,
  pointsOf,
  released,
  RETIRE_SERIES,
  RETURN_SERIES,
  REVIEW,
  submittedSeries,
  WITHDRAW,
} from './actors.js';

const VIEWERS = ['visitor', 'modeller', 'owner', 'other', 'editor', 'administrator'] as const;
type ViewerName = (typeof VIEWERS)[number];

const EVERYBODY = VIEWERS;
const THE_GROUP: readonly ViewerName[] = ['owner', 'other', 'editor', 'administrator'];
const OWNER_AND_EDITORS: readonly ViewerName[] = ['owner', 'editor', 'administrator'];

/** Who sees what; whoever is not named sees nothing. */
const SERIES: Record<string, readonly ViewerName[]> = {
  draft: OWNER_AND_EDITORS,
  returned: OWNER_AND_EDITORS,
  submitted: THE_GROUP,
  accepted: THE_GROUP,
  retired: THE_GROUP,
  used: EVERYBODY,
  'used and retired': EVERYBODY,
  'used by a withdrawn version': EVERYBODY,
};
const FITS: Record<string, readonly ViewerName[]> = {
  unreleased: THE_GROUP,
  'of a draft version': THE_GROUP,
  released: EVERYBODY,
  withdrawn: EVERYBODY,
};
const VERSIONS: Record<string, readonly ViewerName[]> = {
  draft: THE_GROUP,
  'in review': THE_GROUP,
  returned: THE_GROUP,
  approved: THE_GROUP,
  superseded: EVERYBODY,
  released: EVERYBODY,
  withdrawn: EVERYBODY,
};
const SHEETS: Record<string, readonly ViewerName[]> = {
  'without a release': THE_GROUP,
  'with a release': EVERYBODY,
  'all withdrawn': EVERYBODY,
};

const cases = (table: Record<string, readonly ViewerName[]>) =>
  Object.entries(table).flatMap(([name, seers]) =>
    VIEWERS.map((viewer) => [viewer, seers.includes(viewer) ? 'sees' : 'does not see', name] as const),
  );

describe('who sees what', () => {
  let group: Group;
  let crew: Crew;
  let viewers: Record<ViewerName, Actor>;
  const series: Record<string, Made> = {};
  const fits: Record<string, Made> = {};
  const versions: Record<string, Made> = {};
  const sheets: Record<string, Made> = {};

  const asks = async (viewer: ViewerName, query: string, variables: object = {}) =>
    await viewers[viewer].ask(query, variables);
  const codeOf = async (version: Made) =>
    (
      await group.server.sql<{ id: string; code: string; pair: string }>(
        `SELECT d.id, d.code, d.pair_id AS pair FROM data_sheets d JOIN data_sheet_versions v ON v.data_sheet_id = d.id WHERE v.id = $1`,
        [version['id']],
      )
    )[0]!;

  async function prepareSeries(): Promise<void> {
    const { researcher, editor } = crew;
    series['draft'] = await draftSeries(researcher);
    series['submitted'] = await submittedSeries(researcher);
    series['returned'] = await submittedSeries(researcher);
    await done(editor, RETURN_SERIES, { id: series['returned']['id'], remark: 'Why?' });
    series['accepted'] = await acceptedSeries(crew);
    series['retired'] = await acceptedSeries(crew);
    await done(editor, RETIRE_SERIES, { id: series['retired']['id'], remark: 'Invented.' });
    series['used'] = await acceptedSeries(crew);
    series['used and retired'] = await acceptedSeries(crew);
    const second = [series['used']['id'], series['used and retired']['id']];
    fits['released'] = await fitted(editor, series['used']['pair'].id, { seriesIds: second });
    fits['unreleased'] = await fitted(editor, series['used']['pair'].id);
  }

  async function prepareVersions(): Promise<void> {
    const { editor, reviewer } = crew;
    const fitId = fits['released']!['id'];
    versions['superseded'] = await released(crew, fitId);
    versions['released'] = await released(crew, fitId);
    await done(editor, RETIRE_SERIES, { id: series['used and retired']!['id'], remark: 'Invented.' });
    versions['draft'] = await drafted(editor, fitId);
    versions['in review'] = await inReview(editor, fitId);
    versions['approved'] = await approved(crew, fitId);
    versions['returned'] = await inReview(editor, fitId);
    const input = { versionId: versions['returned']['id'], verdict: 'RETURN', remark: 'Why?' };
    await done(reviewer, REVIEW, { input });
    sheets['with a release'] = await codeOf(versions['released']);
  }

  async function prepareOtherSheets(): Promise<void> {
    const { editor } = crew;
    const points = {
      points: pointsOf([
        [300, 3e-5],
        [350, 4e-5],
        [400, 5e-5],
        [450, 6e-5],
      ]),
    };
    const neon = (await acceptedSeries(crew, { b: { name: 'neon' }, ...points }))['pair'].id;
    fits['of a draft version'] = await fitted(editor, neon);
    sheets['without a release'] = await codeOf(await drafted(editor, fits['of a draft version']['id']));
    series['used by a withdrawn version'] = await acceptedSeries(crew, { b: { name: 'krypton' }, ...points });
    fits['withdrawn'] = await fitted(editor, series['used by a withdrawn version']['pair'].id);
    versions['withdrawn'] = await released(crew, fits['withdrawn']['id']);
    sheets['all withdrawn'] = await codeOf(versions['withdrawn']);
    const reason = { id: versions['withdrawn']['id'], reason: 'Invented.', password: PASSWORD };
    await done(editor, WITHDRAW, reason);
  }

  beforeAll(async () => {
    group = await Group.start();
    crew = await crewOf(group);
    viewers = {
      visitor: group.visitor,
      modeller: await group.join('modeller', 'MODELLER'),
      owner: crew.researcher,
      other: await group.join('other', 'RESEARCHER'),
      editor: crew.editor,
      administrator: await group.join('administrator', 'ADMINISTRATOR'),
    };
    await prepareSeries();
    await prepareVersions();
    await prepareOtherSheets();
  }, 120_000);
  afterAll(() => group.stop());

  const NODE = 'query ($id: ID!) { node(id: $id) { __typename id } }';
  const node = async (viewer: ViewerName, id: string) => (await asks(viewer, NODE, { id }))['node'];

  describe('a series', () => {
    it.each(cases(SERIES))('%s %s one that is %s', async (viewer, sees, name) => {
      const { id, pair } = series[name]!;
      const expected = sees === 'sees';
      expect(await node(viewer, id)).toEqual(expected ? { __typename: 'Series', id } : null);
      const ways = await asks(
        viewer,
        `query ($id: ID!, $pair: ID!) { oneSeries(id: $id) { id }
          node(id: $pair) { ... on GasPair { series(first: 100) { totalCount edges { node { id } } } } } }`,
        { id, pair: pair.id },
      );
      expect(ways['oneSeries']).toEqual(expected ? { id } : null);
      const listed = ways['node'].series as { totalCount: number; edges: { node: { id: string } }[] };
      expect(listed.edges.some((edge) => edge.node.id === id)).toBe(expected);
      expect(listed.totalCount).toBe(listed.edges.length);
    });

    it.each(VIEWERS)('a list of all gives %s what that person may see, and a visitor nothing', async (viewer) => {
      const query = '{ allSeries(first: 100) { edges { node { id } } } }';
      if (viewer === 'visitor') {
        expect(await viewers.visitor.codeOf(query)).toBe('UNAUTHENTICATED');
        return;
      }
      const ids = ((await asks(viewer, query))['allSeries'].edges as Made[]).map((edge) => edge['node'].id as string);
      for (const [name, seers] of Object.entries(SERIES)) {
        expect([name, ids.includes(series[name]!['id'])]).toEqual([name, seers.includes(viewer)]);
      }
    });

    it('shows its owner and what happened to it to the group alone', async () => {
      const query = `query ($id: ID!) { node(id: $id) { ... on Series { createdBy { id } events { action } } } }`;
      const { id } = series['used']!;
      expect((await asks('modeller', query, { id }))['node']).toEqual({ createdBy: null, events: [] });
      expect((await asks('other', query, { id }))['node'].createdBy).toEqual({ id: crew.researcher.id });
    });

    it('leads not to a hidden one whose data it repeats', async () => {
      const hidden = await draftSeries(crew.researcher);
      const repeat = await acceptedSeries(crew, { sameDataAsId: hidden['id'] });
      const query = 'query ($id: ID!) { node(id: $id) { ... on Series { sameDataAs { id } } } }';
      expect((await asks('other', query, { id: repeat['id'] }))['node'].sameDataAs).toBeNull();
      expect((await asks('owner', query, { id: repeat['id'] }))['node'].sameDataAs).toEqual({ id: hidden['id'] });
    });
  });

  describe('a fit', () => {
    it.each(cases(FITS))('%s %s one that is %s', async (viewer, sees, name) => {
      const { id } = fits[name]!;
      const expected = sees === 'sees';
      expect(await node(viewer, id)).toEqual(expected ? { __typename: 'Fit', id } : null);
      const direct = await asks(viewer, 'query ($id: ID!) { fit(id: $id) { id } }', { id });
      expect(direct['fit']).toEqual(expected ? { id } : null);
    });

    it.each(VIEWERS)('%s lists those of a pair only as a member of the group', async (viewer) => {
      const query = 'query ($id: ID!) { node(id: $id) { ... on GasPair { fits { id } } } }';
      const listed = (await asks(viewer, query, { id: series['used']!['pair'].id }))['node'].fits as Made[];
      expect(listed.length > 0).toBe(THE_GROUP.includes(viewer));
    });

    it('shows the public, of what it left out, nothing', async () => {
      const query = 'query ($id: ID!) { fit(id: $id) { series { id } leftOutSeries { series { id } } } }';
      const { id } = fits['released']!;
      const shown = (await asks('visitor', query, { id }))['fit'];
      expect(shown['leftOutSeries']).toEqual([]);
      expect(shown['series']).toHaveLength(2);
      expect((await asks('other', query, { id }))['fit'].leftOutSeries).not.toEqual([]);
    });
  });

  describe('a version', () => {
    it.each(cases(VERSIONS))('%s %s one that is %s', async (viewer, sees, name) => {
      const { id } = versions[name]!;
      const expected = sees === 'sees';
      expect(await node(viewer, id)).toEqual(expected ? { __typename: 'DataSheetVersion', id } : null);
      const { code } = await codeOf(versions[name]);
      const query = 'query ($code: String!) { dataSheet(code: $code) { versions { id } } }';
      const listed = (await asks(viewer, query, { code }))['dataSheet'].versions as Made[];
      expect(listed.some((version) => version['id'] === id)).toBe(expected);
    });

    it('is not found by the number of a draft, except by the group', async () => {
      const { code } = sheets['with a release']!;
      const query = 'query ($code: String!) { dataSheet(code: $code) { version(number: "1.2") { status } } }';
      expect((await asks('modeller', query, { code }))['dataSheet'].version).toBeNull();
      expect((await asks('other', query, { code }))['dataSheet'].version).not.toBeNull();
    });

    it('shows reviews and changes of state to the group alone', async () => {
      const query = `query ($id: ID!) { node(id: $id) { ... on DataSheetVersion { reviews { remark } events { action } } } }`;
      const { id } = versions['released']!;
      expect((await asks('visitor', query, { id }))['node']).toEqual({ reviews: [], events: [] });
      expect((await asks('editor', query, { id }))['node'].reviews).toHaveLength(1);
    });
  });

  describe('a data sheet', () => {
    it.each(cases(SHEETS))('%s %s one %s', async (viewer, sees, name) => {
      const { id, code, pair } = sheets[name]!;
      const expected = sees === 'sees' ? { id } : null;
      expect((await node(viewer, id))?.['id'] ?? null).toBe(expected?.id ?? null);
      const ways = await asks(
        viewer,
        `query ($code: String!, $pair: ID!) { dataSheet(code: $code) { id } dataSheets(first: 100) { edges { node { id } } }
          node(id: $pair) { ... on GasPair { dataSheet { id } } } }`,
        { code, pair },
      );
      expect(ways['dataSheet']).toEqual(expected);
      expect(ways['node'].dataSheet).toEqual(expected);
      const listed = ways['dataSheets'].edges as { node: { id: string } }[];
      expect(listed.some((edge) => edge.node.id === id)).toBe(sees === 'sees');
    });
  });

  describe('node', () => {
    it('gives a person to the group and to oneself, never an address', async () => {
      const { id } = crew.editor;
      expect(await node('visitor', id)).toBeNull();
      expect(await node('modeller', id)).toBeNull();
      expect(await node('modeller', viewers.modeller.id)).toEqual({ __typename: 'Person', id: viewers.modeller.id });
      expect(await node('other', id)).toEqual({ __typename: 'Person', id });
    });

    it.each(VIEWERS)('gives %s substances and pairs', async (viewer) => {
      const pairId = series['used']!['pair'].id;
      expect(await node(viewer, pairId)).toEqual({ __typename: 'GasPair', id: pairId });
      const query = 'query ($id: ID!) { node(id: $id) { ... on GasPair { substances { id } } } }';
      const [substance] = (await asks(viewer, query, { id: pairId }))['node'].substances as Made[];
      expect(await node(viewer, substance!['id'])).toEqual({ __typename: 'Substance', id: substance!['id'] });
    });

    it.each(['', 'nothing', '1', '00000000-0000-4000-8000-000000000000', "' OR true --"])(
      'gives nothing for the id “%s”',
      async (id) => {
        expect(await node('administrator', id)).toBeNull();
      },
    );
  });
});
