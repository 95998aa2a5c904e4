import { afterAll, beforeAll, describe, expect, it } from '@jest/globals';
import { jobQueue } from '../src/jobs/job-queue.js';
import { JobsService } from '../src/jobs/jobs.service.js';
import { RunningServer } from './running-server.js';

describe('the job queue', () => {
  let server: RunningServer;
  let jobs: JobsService;
  const count = async (queue: string) =>
    (await server.sql<{ n: number }>('SELECT count(*)::int AS n FROM pgboss.job WHERE name = $1', [queue]))[0]!.n;

  beforeAll(async () => {
    server = await RunningServer.start();
    jobs = server.app.get(JobsService, { strict: false });
  });
  afterAll(() => server.stop());

  it('makes a job with the transaction that sends it, or not at all', async () => {
    const queue = jobQueue<{ n: number }>('test.transaction');
    await expect(
      server.dataSource.transaction(async (manager) => {
        await jobs.send(manager, queue, { n: 1 });
        throw new Error('rolled back');
      }),
    ).rejects.toThrow('rolled back');
    expect(await count('test.transaction')).toBe(0);

    await server.dataSource.transaction((manager) => jobs.send(manager, queue, { n: 2 }));
    expect(await count('test.transaction')).toBe(1);
  });

  it('shows a job to no worker before its transaction commits', async () => {
    const queue = jobQueue<object>('test.hidden');
    const begun: number[] = [];
    await jobs.work(queue, () => {
      begun.push(performance.now());
      return Promise.resolve();
    });
    let committing = 0;
    await server.dataSource.transaction(async (manager) => {
      await jobs.send(manager, queue, {});
      await new Promise((resolve) => setTimeout(resolve, 1_200));
      committing = performance.now();
    });

    await server.eventually(() => Promise.resolve(begun[0]));
    expect(begun).toHaveLength(1);
    expect(begun[0]).toBeGreaterThan(committing);
  });

  it('refuses to send outside a transaction', async () => {
    await expect(jobs.send(server.dataSource.manager, jobQueue('test.outside'), {})).rejects.toThrow(
      'inside a transaction',
    );
  });

  it('tries a failing job again, the others of its batch not', async () => {
    const queue = jobQueue<{ name: string }>('test.retry', { retryDelaySeconds: 1, retryLimit: 3 });
    const runs: string[] = [];
    await server.dataSource.transaction(async (manager) => {
      for (const name of ['fails once', 'works', 'works too']) await jobs.send(manager, queue, { name });
    });
    await jobs.work(queue, ({ data: { name } }) => {
      runs.push(name);
      return name === 'fails once' && runs.filter((run) => run === name).length === 1
        ? Promise.reject(new Error('not yet'))
        : Promise.resolve();
    });

    await server.eventually(() => Promise.resolve(runs.length === 4 ? true : undefined));
    await new Promise((resolve) => setTimeout(resolve, 1_000));
    expect(runs.sort()).toEqual(['fails once', 'fails once', 'works', 'works too']);
  });

  it('gives the same id to a job that runs again', async () => {
    const queue = jobQueue<object>('test.same-id', { retryDelaySeconds: 1, retryLimit: 1 });
    const ids: string[] = [];
    await jobs.work(queue, ({ id }) => {
      ids.push(id);
      return ids.length === 1 ? Promise.reject(new Error('not yet')) : Promise.resolve();
    });
    const id = await server.dataSource.transaction((manager) => jobs.send(manager, queue, {}));

    await server.eventually(() => Promise.resolve(ids.length === 2 ? true : undefined));
    expect(ids).toEqual([id, id]);
  });

  it('runs again a job whose server died', async () => {
    const queue = jobQueue<object>('test.orphan', { expireInSeconds: 1, retryDelaySeconds: 1 });
    let runs = 0;
    const id = await server.dataSource.transaction((manager) => jobs.send(manager, queue, {}));
    // As a server leaves it that fetched the job and was killed.
    await server.sql(`UPDATE pgboss.job SET state = 'active', started_on = now() - interval '1 minute' WHERE id = $1`, [
      id,
    ]);
    await jobs.work(queue, () => {
      runs += 1;
      return Promise.resolve();
    });

    await server.eventually(() => Promise.resolve(runs > 0 ? true : undefined), 45_000);
    expect(runs).toBe(1);
  }, 60_000);

  it('makes one job for one key within its time', async () => {
    const queue = jobQueue<object>('test.once');
    const send = () =>
      server.dataSource.transaction((manager) => jobs.send(manager, queue, {}, { key: 'k', onceInSeconds: 3600 }));
    const ids = [await send(), await send()];

    expect(ids[0]).toEqual(expect.any(String));
    expect(ids[1]).toBeNull();
  });

  it('keeps a job that failed for good, and shows administrators what and why', async () => {
    const queue = jobQueue<object>('test.hopeless', { retryLimit: 0 });
    await jobs.work(queue, () => Promise.reject(new Error('the registrar is gone')));
    await server.dataSource.transaction((manager) => jobs.send(manager, queue, { secret: 'kept out' }));
    await server.addPerson('administrator@group.example', 'ADMINISTRATOR');
    const { accessToken } = await server.signIn('administrator@group.example');
    const overview = async () => {
      const query =
        '{ jobs { queues { queue waiting active completed failed } failures { id queue failedAt attempts reason } } }';
      return (await server.ask(query, {}, accessToken)).data!.jobs;
    };
    const jobsShown = await server.eventually(async () => {
      const shown = await overview();
      return shown.failures.length > 0 ? shown : undefined;
    });

    expect(jobsShown.failures).toEqual([
      {
        id: expect.any(String),
        queue: 'test.hopeless',
        failedAt: expect.any(String),
        attempts: 1,
        reason: 'the registrar is gone',
      },
    ]);
    expect(jobsShown.queues).toContainEqual({ queue: 'test.hopeless', waiting: 0, active: 0, completed: 0, failed: 1 });
    expect(JSON.stringify(jobsShown)).not.toContain('kept out');
    expect(await count('dead-letters')).toBe(1);
  });

  it('lets a running job end when the server stops', async () => {
    const other = await RunningServer.start();
    const queue = jobQueue<object>('test.drain');
    let ended = false;
    let begun = false;
    const service = other.app.get(JobsService, { strict: false });
    await service.work(queue, async () => {
      begun = true;
      await new Promise((resolve) => setTimeout(resolve, 800));
      await other.sql('SELECT 1');
      ended = true;
    });
    await other.dataSource.transaction((manager) => service.send(manager, queue, {}));
    await other.eventually(() => Promise.resolve(begun ? true : undefined));

    await other.stop();

    expect(ended).toBe(true);
  });
});
