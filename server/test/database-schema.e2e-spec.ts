import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import { type DataSource } from 'typeorm';
import { createDataSource } from '../src/database/data-source.js';
import { createTestDatabase, type TestDatabase } from './database.js';

describe('the database schema', () => {
  let database: TestDatabase;
  let dataSource: DataSource;

  beforeAll(async () => {
    database = await createTestDatabase({ migrated: false });
    dataSource = await createDataSource(database.url).initialize();
    await dataSource.runMigrations({ transaction: 'all' });
  });

  afterAll(async () => {
    await dataSource.destroy();
    await database.drop();
  });

  it('migrates down to nothing and up again', async () => {
    const count = dataSource.migrations.length;
    for (let i = 0; i < count; i += 1) await dataSource.undoLastMigration({ transaction: 'all' });
    const left: { table_name: string }[] = await dataSource.query(
      `SELECT table_name FROM information_schema.tables WHERE table_schema = 'public' AND table_name NOT IN ('migrations', 'typeorm_metadata')`,
    );
    expect(left).toEqual([]);
    await dataSource.runMigrations({ transaction: 'all' });
  });

  // CAS Registry Numbers from memory: water, argon; 7732-18-4 has a wrong check digit.
  it.each([
    ['7732-18-5', true],
    ['7440-37-1', true],
    ['7732-18-4', false],
    ['773218-5', false],
  ])('judges the check digit of CAS RN %s', async (casNumber, isValid) => {
    const [row]: { valid: boolean }[] = await dataSource.query('SELECT cas_number_is_valid($1) AS valid', [casNumber]);
    expect(row?.valid).toBe(isValid);
  });
});
