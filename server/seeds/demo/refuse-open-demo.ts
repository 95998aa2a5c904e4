import { isIP } from 'node:net';
import { DataSource } from 'typeorm';

function isLoopback(host: string): boolean {
  if (host === 'localhost' || host === '::1') return true;
  return isIP(host) === 4 && host.startsWith('127.');
}

/**
 * The demo's accounts share one published password: they must not be reachable from elsewhere.
 *
 * @throws {Error} when the server would listen beyond loopback while such accounts exist
 */
export async function refuseOpenDemo(dataSource: DataSource, host: string): Promise<void> {
  if (isLoopback(host)) return;
  const [demo]: object[] = await dataSource.query(`SELECT FROM people WHERE email LIKE '%@demo.example' LIMIT 1`);
  if (demo) throw new Error(`Demo accounts exist, so the server listens on loopback only and not on ${host}.`);
}
