import { afterAll, beforeAll, beforeEach, describe, expect, it, jest } from '@jest/globals';
import { ReleaseArchiveService } from '../src/releases/release-archive.service.js';
import {
  ACCEPT_SERIES,
  acceptedSeries,
  type Crew,
  CREATE_SERIES,
  crewOf,
  DRAFT,
  drafted,
  draftSeries,
  fitted,
  Group,
  INVENTED_POINTS,
  inReview,
  type Made,
  PASSWORD,
  pointsOf,
  RETURN_SERIES,
  REVIEW,
  SERIES_INPUT,
  SUBMIT_SERIES,
  SUBMIT_VERSION,
  submittedSeries,
  UPDATE_DRAFT,
  UPDATE_SERIES,
  WITHDRAW,
} from './actors.js';
import {
  aftermathOf,
  approvedVersion,
  fitOf,
  overlapping,
  releasedNumbers,
  releasing,
  returning,
  together,
  WON,
} from './races.js';

const ROUNDS = [1, 2, 3, 4, 5];
const ONE_WINNER = ['CONFLICT', WON];

describe('of two who act at once', () => {
  let group: Group;
  let crew: Crew;
  let fitId: string;

  beforeAll(async () => {
    group = await Group.start();
    crew = await crewOf(group);
    // The printing of each release has its own test; here it would only slow the races down.
    const archive = group.server.app.get(ReleaseArchiveService, { strict: false });
    jest.spyOn(archive, 'archivePdf').mockResolvedValue(undefined);
    fitId = await fitOf(crew, 'helium');
  });
  afterAll(() => group.stop());

  const edit = (version: Made, summary: string) => ({
    actor: crew.editor,
    mutation: UPDATE_DRAFT,
    variables: {
      input: { versionId: version['id'], lockVersion: version['lockVersion'], summary, changeNote: 'Invented.' },
    },
  });
  const versionRow = (id: string) => ({ table: 'data_sheet_versions', id });

  it.each(ROUNDS)('one edits a draft version and the other hears CONFLICT (round %i)', async () => {
    const draft = await drafted(crew.editor, fitId);
    const outcomes = await overlapping(versionRow(draft['id']), edit(draft, 'first'), edit(draft, 'second'));
    expect([...outcomes].sort()).toEqual(ONE_WINNER);
    const [row] = await group.server.sql<{ summary: string; lock_version: number }>(
      'SELECT summary, lock_version FROM data_sheet_versions WHERE id = $1',
      [draft['id']],
    );
    expect(row).toEqual({ summary: outcomes[0] === WON ? 'first' : 'second', lock_version: draft['lockVersion'] + 1 });
  });

  it.each(ROUNDS)('one edits the points of a draft series and the other hears CONFLICT (round %i)', async () => {
    const draft = await draftSeries(crew.researcher);
    const { a: _a, b: _b, ...header } = SERIES_INPUT;
    const change = (count: number) => ({
      actor: crew.researcher,
      mutation: UPDATE_SERIES,
      variables: {
        input: {
          ...header,
          id: draft['id'],
          lockVersion: draft['lockVersion'],
          points: pointsOf(INVENTED_POINTS).slice(count),
        },
      },
    });
    const outcomes = await overlapping({ table: 'series', id: draft['id'] }, change(1), change(2));
    expect([...outcomes].sort()).toEqual(ONE_WINNER);
    const [row] = await group.server.sql<{ count: number }>(
      'SELECT count(*)::int FROM series_points WHERE series_id = $1',
      [draft['id']],
    );
    expect(row!.count).toBe(INVENTED_POINTS.length - (outcomes[0] === WON ? 1 : 2));
  });

  it.each(ROUNDS)('one accepts a series or the other returns it (round %i)', async () => {
    const series = await submittedSeries(crew.researcher);
    const { id } = series;
    const outcomes = await overlapping(
      { table: 'series', id },
      { actor: crew.editor, mutation: ACCEPT_SERIES, variables: { id } },
      { actor: crew.reviewer, mutation: RETURN_SERIES, variables: { id, remark: 'Which tube?' } },
    );
    expect([...outcomes].sort()).toEqual(ONE_WINNER);
    const rows = await group.server.sql<{ status: string }>(
      'SELECT status FROM series_events WHERE series_id = $1 ORDER BY id',
      [id],
    );
    const winner = outcomes[0] === WON ? 'ACCEPTED' : 'RETURNED';
    expect(rows.map(({ status }) => status)).toEqual(['DRAFT', 'SUBMITTED', winner]);
  });

  it('one submits a series and the other hears CONFLICT', async () => {
    const { id } = await draftSeries(crew.researcher);
    const submit = { actor: crew.researcher, mutation: SUBMIT_SERIES, variables: { id } };
    expect((await overlapping({ table: 'series', id }, submit, submit)).sort()).toEqual(ONE_WINNER);
  });

  it('one hands a version in for review and the other hears CONFLICT', async () => {
    const draft = await drafted(crew.editor, fitId);
    const submit = { actor: crew.editor, mutation: SUBMIT_VERSION, variables: { id: draft['id'] } };
    expect((await overlapping(versionRow(draft['id']), submit, submit)).sort()).toEqual(ONE_WINNER);
  });

  it('one reviews a version and the other hears CONFLICT', async () => {
    const version: string = (await inReview(crew.editor, fitId))['id'];
    const approve = {
      actor: crew.reviewer,
      mutation: REVIEW,
      variables: { input: { versionId: version, verdict: 'APPROVE', remark: '' } },
    };
    expect((await overlapping(versionRow(version), approve, returning(crew, version))).sort()).toEqual(ONE_WINNER);
    const [row] = await group.server.sql<{ count: number }>('SELECT count(*)::int FROM reviews WHERE version_id = $1', [
      version,
    ]);
    expect(row!.count).toBe(1);
  });

  describe('one releases', () => {
    let numbersBefore: string[];
    beforeEach(async () => {
      numbersBefore = await releasedNumbers(crew.editor);
    });

    it.each(ROUNDS)('and the other hears CONFLICT (round %i)', async () => {
      const version = await approvedVersion(crew, fitId);
      const outcomes = await overlapping(versionRow(version), releasing(crew, version), releasing(crew, version));
      expect([...outcomes].sort()).toEqual(ONE_WINNER);
      expect(await aftermathOf(crew.editor, version)).toEqual({
        status: 'RELEASED',
        releases: 1,
        current: 1,
        registrations: 1,
      });
      expect(await releasedNumbers(crew.editor)).toEqual([...numbersBefore, `1.${numbersBefore.length}`]);
    });

    it.each(ROUNDS)('or the other returns, with nothing half done (round %i)', async () => {
      const version = await approvedVersion(crew, fitId);
      const outcomes = await overlapping(versionRow(version), releasing(crew, version), returning(crew, version));
      expect([...outcomes].sort()).toEqual(ONE_WINNER);
      const isReleased = outcomes[0] === WON;
      expect(await aftermathOf(crew.editor, version)).toEqual({
        status: isReleased ? 'RELEASED' : 'RETURNED',
        releases: isReleased ? 1 : 0,
        current: 1,
        registrations: isReleased ? 1 : 0,
      });
    });

    it.each(ROUNDS)('one of two approved versions of a sheet, and the other goes back (round %i)', async () => {
      const versions = [await approvedVersion(crew, fitId), await approvedVersion(crew, fitId)] as const;
      const outcomes = await overlapping(
        versionRow(versions[0]),
        releasing(crew, versions[0]),
        releasing(crew, versions[1]),
      );
      expect([...outcomes].sort()).toEqual(ONE_WINNER);
      const [won, lost] = outcomes[0] === WON ? versions : [versions[1], versions[0]];
      expect(await aftermathOf(crew.editor, won)).toMatchObject({ status: 'RELEASED', current: 1 });
      expect(await aftermathOf(crew.editor, lost)).toMatchObject({ status: 'RETURNED', releases: 0 });
      expect(await releasedNumbers(crew.editor)).toEqual([...numbersBefore, `1.${numbersBefore.length}`]);
    });

    it('a version while its forerunner is withdrawn', async () => {
      const [current] = await group.server.sql<{ id: string }>(
        `SELECT id FROM data_sheet_versions WHERE status = 'RELEASED'`,
      );
      const version = await approvedVersion(crew, fitId);
      const withdraw = {
        actor: crew.editor,
        mutation: WITHDRAW,
        variables: { id: current!.id, reason: 'Invented.', password: PASSWORD },
      };
      const outcomes = await together(releasing(crew, version), withdraw);
      // Whether withdrawn first or superseded first, there is one current version after.
      expect(outcomes[0]).toBe(WON);
      expect(ONE_WINNER).toContain(outcomes[1]);
      expect(await aftermathOf(crew.editor, version)).toMatchObject({ status: 'RELEASED', current: 1 });
    });
  });

  it('both bring in series of a new pair, which is made once', async () => {
    for (const b of ['neon', 'krypton', 'xenon', 'hydrogen', 'nitrogen']) {
      const input = { ...SERIES_INPUT, b: { name: b } };
      const mirrored = { ...input, a: input.b, b: input.a };
      const create = (as: object) => ({ actor: crew.researcher, mutation: CREATE_SERIES, variables: { input: as } });
      expect(await together(create(input), create(mirrored), create(input))).toEqual([WON, WON, WON]);
      const pairs = await group.server.sql<object>(
        `SELECT FROM gas_pairs JOIN substances b ON b.id IN (first_id, second_id)
           JOIN substances a ON a.id IN (first_id, second_id) WHERE b.name = $1 AND a.name = 'argon'`,
        [b],
      );
      expect(pairs).toHaveLength(1);
    }
  });

  it('both draft the first version of a pair, on one sheet', async () => {
    const series = await acceptedSeries(crew, { b: { name: 'oxygen' } });
    const fit = await fitted(crew.editor, series['pair'].id);
    const draft = (actor = crew.editor) => ({
      actor,
      mutation: DRAFT,
      variables: { input: { fitId: fit['id'], summary: 'Invented.' } },
    });
    expect(await together(draft(), draft(crew.reviewer))).toEqual([WON, WON]);
    const sheets = await group.server.sql<object>('SELECT FROM data_sheets WHERE pair_id = $1', [series['pair'].id]);
    expect(sheets).toHaveLength(1);
  });
});
