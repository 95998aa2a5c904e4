import { codeOf } from './running-server.js';
import { acceptedSeries, type Actor, approved, type Crew, fitted, PASSWORD, RELEASE, REVIEW } from './actors.js';

/** One of several acts that are tried at the same time. */
export interface Act {
  readonly actor: Actor;
  readonly mutation: string;
  readonly variables: object;
}

/** Several acts at once make a slow machine slower. */
const LONGEST_WAIT_MS = 25_000;

export const WON = 'won';

/** @returns `won`, or the code of the GraphQL error or of the first problem */
export async function outcomeOf({ actor, mutation, variables }: Act): Promise<string> {
  const answer = await actor.server.ask(mutation, variables, actor.token);
  const error = codeOf(answer);
  if (error !== undefined) return error;
  const payload = Object.values(answer.data ?? {})[0] as { problems: { code: string }[] };
  return payload.problems[0]?.code ?? WON;
}

/** The outcomes of acts that arrive together, in the order of the acts. */
export const together = (...acts: Act[]): Promise<string[]> => Promise.all(acts.map(outcomeOf));

/**
 * The outcomes of acts that are certain to overlap: a row all of them want is held until each waits for a lock.
 *
 * @param row a table and the id of its row
 */
export async function overlapping(row: { table: string; id: string }, ...acts: Act[]): Promise<string[]> {
  const { server } = acts[0]!.actor;
  const holder = server.dataSource.createQueryRunner();
  await holder.startTransaction();
  await holder.query(`SELECT FROM ${row.table} WHERE id = $1 FOR UPDATE`, [row.id]);
  const outcomes = Promise.all(acts.map(outcomeOf));
  try {
    await server.eventually(async () => {
      const [waiting]: { count: number }[] = await server.sql(
        `SELECT count(*)::int FROM pg_stat_activity WHERE datname = current_database() AND wait_event_type = 'Lock'`,
      );
      return waiting!.count >= acts.length ? true : undefined;
    }, LONGEST_WAIT_MS);
  } finally {
    await holder.commitTransaction();
    await holder.release();
  }
  return outcomes;
}

/** @returns the id of a fit to an accepted series of argon with another gas */
export async function fitOf(crew: Crew, gas: string): Promise<string> {
  const series = await acceptedSeries(crew, { b: { name: gas } });
  return (await fitted(crew.editor, series['pair'].id))['id'];
}

/** @returns the id of a version that may be released */
export const approvedVersion = async (crew: Crew, fitId: string): Promise<string> =>
  (await approved(crew, fitId))['id'];

export const releasing = ({ reviewer }: Crew, id: string): Act => ({
  actor: reviewer,
  mutation: RELEASE,
  variables: { id, password: PASSWORD },
});

export const returning = ({ reviewer }: Crew, versionId: string): Act => ({
  actor: reviewer,
  mutation: REVIEW,
  variables: { input: { versionId, verdict: 'RETURN', remark: 'Not yet.' } },
});

/** What is left of a sheet's releases after a race. */
export interface Aftermath {
  readonly status: string;
  readonly releases: number;
  readonly current: number;
  readonly registrations: number;
}

/** How a version stands, the releases of it, the current versions of its sheet, and the DOIs sent for registration. */
export async function aftermathOf(actor: Actor, versionId: string): Promise<Aftermath> {
  const [row] = await actor.server.sql<Aftermath>(
    `SELECT v.status,
       (SELECT count(*) FROM releases r WHERE r.version_id = v.id)::int AS releases,
       (SELECT count(*) FROM data_sheet_versions o
         WHERE o.data_sheet_id = v.data_sheet_id AND o.status = 'RELEASED')::int AS current,
       (SELECT count(*) FROM pgboss.job j
         WHERE j.name = 'doi.register' AND j.data ->> 'versionId' = v.id::text)::int AS registrations
     FROM data_sheet_versions v WHERE v.id = $1`,
    [versionId],
  );
  return row!;
}

/** The numbers of a sheet's released versions, in the order of their release. */
export async function releasedNumbers(actor: Actor): Promise<string[]> {
  const rows = await actor.server.sql<{ number: string }>(
    `SELECT v.edition || '.' || v.revision AS number FROM releases r JOIN data_sheet_versions v ON v.id = r.version_id
      ORDER BY r.sequence`,
  );
  return rows.map(({ number }) => number);
}
