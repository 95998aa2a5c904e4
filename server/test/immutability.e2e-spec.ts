import { createHash } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import {
  acceptedSeries,
  type Crew,
  crewOf,
  drafted,
  draftSeries,
  fitted,
  Group,
  type Made,
  released,
} from './actors.js';

/** PostgreSQL's SQLSTATEs (documentation, appendix A). */
const RESTRICT = '23001';
const INTEGRITY = '23000';
const NOT_NULL = '23502';
const FOREIGN_KEY = '23503';
const UNIQUE = '23505';
const CHECK = '23514';

const sha256 = (text: string) => createHash('sha256').update(text).digest('hex');

describe('the database, whoever asks, refuses', () => {
  let group: Group;
  let crew: Crew;
  let series: Made;
  let fit: Made;
  let version: Made;

  beforeAll(async () => {
    group = await Group.start();
    crew = await crewOf(group);
    series = await acceptedSeries(crew);
    fit = await fitted(crew.editor, series['pair'].id);
    version = await released(crew, fit['id']);
  });
  afterAll(() => group.stop());

  /** @returns the SQLSTATE with which a statement is refused, in a transaction that is undone all the same */
  async function refusalOf(statement: string, values: unknown[] = []): Promise<string | undefined> {
    const runner = group.server.dataSource.createQueryRunner();
    await runner.startTransaction();
    try {
      await runner.query(statement, values);
      return undefined;
    } catch (error) {
      return (error as { driverError: { code: string } }).driverError.code;
    } finally {
      await runner.rollbackTransaction();
      await runner.release();
    }
  }

  it.each([
    ['UPDATE releases SET snapshot = snapshot'],
    ["UPDATE releases SET doi = '10.0/other'"],
    ['DELETE FROM releases'],
    ['TRUNCATE releases'],
    ['TRUNCATE data_sheet_versions CASCADE'],
    ['DELETE FROM data_sheet_versions'],
    ["UPDATE data_sheet_versions SET status = 'DRAFT'"],
    ["UPDATE data_sheet_versions SET summary = 'Better words.'"],
    ['UPDATE data_sheet_versions SET edition = 2'],
    [`UPDATE data_sheet_versions SET validity = '{"minimum": 1, "maximum": 2, "reason": "x"}'`],
    ["UPDATE fits SET engine_version = 'other'"],
    ['DELETE FROM fits'],
    ['DELETE FROM fit_series'],
    ['TRUNCATE fits CASCADE'],
    ['TRUNCATE fit_series'],
    ['TRUNCATE reviews'],
    ['TRUNCATE version_events'],
    ['TRUNCATE series_events'],
    ['TRUNCATE series_points'],
    ["UPDATE reviews SET verdict = 'RETURN'"],
    ['DELETE FROM version_events'],
    ['DELETE FROM series_events'],
    ['UPDATE series_points SET diffusivity_m2_s = 2 * diffusivity_m2_s'],
    ['DELETE FROM series_points'],
  ])('%s', async (statement) => {
    expect(await refusalOf(statement)).toBe(RESTRICT);
  });

  it('a point more in an accepted series', async () => {
    const statement =
      'INSERT INTO series_points (series_id, index, temperature_k, pressure_pa, diffusivity_m2_s) VALUES ($1, 99, 300, 1e5, 1e-5)';
    expect(await refusalOf(statement, [series['id']])).toBe(RESTRICT);
    const draft = await draftSeries(crew.researcher);
    expect(await refusalOf(statement, [draft['id']])).toBeUndefined();
  });

  it.each([
    ['temperature_k', '0'],
    ['temperature_k', "'Infinity'"],
    ['temperature_k', "'NaN'"],
    ['pressure_pa', '-101325'],
    ['pressure_pa', "'NaN'"],
    ['diffusivity_m2_s', '0'],
    ['diffusivity_m2_s', "'Infinity'"],
    ['diffusivity_u_m2_s', '-1e-7'],
    ['mole_fraction', '1.1'],
    ['replicates', '0'],
    ['pressure_origin', "'GUESSED'"],
    ['uncertainty_origin', "'GUESSED'"],
  ])('a point whose %s is %s', async (column, value) => {
    const draft = await draftSeries(crew.researcher);
    expect(await refusalOf(`UPDATE series_points SET ${column} = ${value} WHERE series_id = $1`, [draft['id']])).toBe(
      CHECK,
    );
  });

  it.each([
    ["UPDATE series SET status = 'LOST'"],
    ["UPDATE series SET data_origin = 'HEARSAY'"],
    ["UPDATE series SET title = ''"],
    ['UPDATE series SET same_data_as_id = id'],
    ['UPDATE series SET common_relative_uncertainty = 1'],
    ["UPDATE people SET roles = '{OWNER}'"],
    ["UPDATE people SET email = upper(email) WHERE email LIKE 'editor%'"],
    ["UPDATE substances SET molar_mass_kg_mol = 0 WHERE name = 'argon'"],
    // Argon is 7440-37-1 (CAS RN, from memory); any other last digit is wrong.
    ["UPDATE substances SET cas_number = '7440-37-2' WHERE name = 'argon'"],
    ['UPDATE gas_pairs SET second_id = first_id'],
    [
      "INSERT INTO data_sheet_versions (data_sheet_id, edition, revision, status, fit_id, summary, prepared_by_id) SELECT data_sheet_id, 1, 1, 'SHELVED', fit_id, '', prepared_by_id FROM data_sheet_versions",
    ],
    [
      "INSERT INTO data_sheet_versions (data_sheet_id, edition, revision, fit_id, summary, prepared_by_id) SELECT data_sheet_id, 0, 1, fit_id, '', prepared_by_id FROM data_sheet_versions",
    ],
  ])('by a check: %s', async (statement) => {
    expect(await refusalOf(statement)).toBe(CHECK);
  });

  it('a withdrawal without its reason', async () => {
    expect(await refusalOf("UPDATE data_sheet_versions SET status = 'WITHDRAWN'")).toBe(CHECK);
  });

  it('the same pair the other way round', async () => {
    const mirrored = 'INSERT INTO gas_pairs (first_id, second_id) SELECT second_id, first_id FROM gas_pairs';
    expect(await refusalOf(mirrored)).toBe(UNIQUE);
  });

  it('a second substance of one name in other letters, or of one CAS RN', async () => {
    const copy = (name: string, cas: string) =>
      `INSERT INTO substances (name, formula, molar_mass_kg_mol, cas_number) SELECT ${name}, formula, 0.04, ${cas} FROM substances WHERE name = 'argon'`;
    expect(await refusalOf(copy('upper(name)', 'NULL'))).toBe(UNIQUE);
    expect(await refusalOf(copy("'argon again'", 'cas_number'))).toBe(UNIQUE);
    expect(await refusalOf(copy("'argon again'", 'NULL'))).toBeUndefined();
  });

  describe('a next version', () => {
    const put = (edition: number, revision: number, status: string) =>
      refusalOf(
        `INSERT INTO data_sheet_versions (data_sheet_id, edition, revision, status, fit_id, summary, prepared_by_id)
         SELECT data_sheet_id, $1, $2, $3, fit_id, 'Invented.', prepared_by_id FROM data_sheet_versions WHERE id = $4`,
        [edition, revision, status, version['id']],
      );

    it.each([
      [1, 2],
      [2, 1],
      [3, 0],
    ])('that leaves a gap: %i.%i after 1.0', async (edition, revision) => {
      expect(await put(edition, revision, 'SUPERSEDED')).toBe(INTEGRITY);
    });

    it('of a number that is taken', async () => {
      expect([INTEGRITY, UNIQUE]).toContain(await put(1, 0, 'SUPERSEDED'));
    });

    it('beside a current one', async () => {
      expect(await put(1, 1, 'RELEASED')).toBe(UNIQUE);
      expect(await put(2, 0, 'RELEASED')).toBe(UNIQUE);
      expect(await put(1, 1, 'SUPERSEDED')).toBeUndefined();
    });

    it('that begins a sheet elsewhere than at 1.0', async () => {
      const other = await acceptedSeries(crew, { b: { name: 'neon' } });
      const draft = await drafted(crew.editor, (await fitted(crew.editor, other['pair'].id))['id']);
      const release = (number: string) =>
        refusalOf(`UPDATE data_sheet_versions SET status = 'RELEASED', ${number} WHERE id = $1`, [draft['id']]);
      expect(await release('edition = 2')).toBe(INTEGRITY);
      expect(await release('revision = 1')).toBe(INTEGRITY);
      expect(await release('edition = 1')).toBeUndefined();
    });
  });

  describe('a link that breaks the chain of releases', () => {
    const link = async (sequence: number, previous: string | null, hash?: string) => {
      const draft = await drafted(crew.editor, fit['id']);
      const snapshot = `invented ${sequence}`;
      return refusalOf(
        `INSERT INTO releases (sequence, version_id, content_hash, previous_hash, snapshot, doi, released_by_id, released_at)
         VALUES ($1, $2, $3, $4, $5, 'invented', $6, now())`,
        [sequence, draft['id'], hash ?? sha256(snapshot), previous, snapshot, crew.editor.id],
      );
    };

    it('because it leaves a number out', async () => {
      expect(await link(3, version['contentHash'])).toBe(INTEGRITY);
    });
    it('because it names another release before it, or none', async () => {
      expect(await link(2, sha256('another'))).toBe(INTEGRITY);
      expect([INTEGRITY, CHECK]).toContain(await link(2, null));
    });
    it('because its hash is not that of its snapshot', async () => {
      expect(await link(2, version['contentHash'], sha256('something else'))).toBe(CHECK);
      expect(await link(2, version['contentHash'], 'F'.repeat(64))).toBe(CHECK);
    });
    it('because the number is taken', async () => {
      expect([UNIQUE, CHECK]).toContain(await link(1, version['contentHash']));
    });
    it('but not one that continues it', async () => {
      expect(await link(2, version['contentHash'])).toBeUndefined();
    });
  });

  it('a version of a fit or by a person that is not there', async () => {
    const put = (fitId: string | null) =>
      refusalOf(
        `INSERT INTO data_sheet_versions (data_sheet_id, edition, revision, fit_id, summary, prepared_by_id)
         SELECT data_sheet_id, 1, 1, $1::uuid, '', prepared_by_id FROM data_sheet_versions WHERE id = $2`,
        [fitId, version['id']],
      );
    expect(await put('00000000-0000-4000-8000-000000000000')).toBe(FOREIGN_KEY);
    expect(await put(null)).toBe(NOT_NULL);
  });
});

describe('the entities', () => {
  let group: Group;

  beforeAll(async () => {
    group = await Group.start();
  });
  afterAll(() => group.stop());

  it('state the tables, columns, types and defaults that the migrations make', async () => {
    // TypeORM looks generated columns up in a table of its own, which only its `synchronize` would make.
    await group.server.sql(
      'CREATE TABLE typeorm_metadata (type text, database text, schema text, "table" text, name text, value text)',
    );
    const { upQueries } = await group.server.dataSource.driver.createSchemaBuilder().log();
    // Keys, checks, indexes and a sheet's number and code stand in the migrations alone, where SQL says all of them.
    const theirs = / DROP CONSTRAINT |^DROP INDEX |"data_sheets" .*"(number|(TEMP_OLD_)?code)"|"typeorm_metadata"/;
    const drift = upQueries.map(({ query }) => query).filter((query) => !theirs.test(query));
    expect(drift).toEqual([]);
  });
});
