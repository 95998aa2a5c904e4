import { createDataSource } from './data-source.js';

/** Brings the database at `url` to the newest schema. */
export async function migrate(url: string): Promise<void> {
  const dataSource = createDataSource(url);
  await dataSource.initialize();
  try {
    await dataSource.runMigrations({ transaction: 'all' });
  } finally {
    await dataSource.destroy();
  }
}
