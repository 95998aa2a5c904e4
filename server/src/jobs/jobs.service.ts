import { Inject, Injectable, Logger, type BeforeApplicationShutdown } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import PgBoss from 'pg-boss';
import { type DataSource, type EntityManager } from 'typeorm';
import { ENV } from '../config/config.module.js';
import { type Env } from '../config/env.js';
import { type JobHandler, type JobQueue, type SendOptions } from './job-queue.js';

const SCHEMA = 'pgboss';
const CONNECTIONS = 3;
const CONNECT_TIMEOUT_MS = 2_000;
const QUERY_TIMEOUT_MS = 30_000;
const POLLING_INTERVAL_SECONDS = 0.5;
const BATCH_SIZE = 10;
/** Looks for jobs whose server died, so that they run again. */
const MAINTENANCE_INTERVAL_SECONDS = 10;
const FAILED_KEPT_SECONDS = 14 * 24 * 3600;
/** Longer than any `onceInSeconds`: the queue looks among the jobs kept for the one that was made already. */
const COMPLETED_KEPT_SECONDS = 2 * 24 * 3600;
const STOP_TIMEOUT_MS = 5_000;

/** Jobs that failed for good, kept for the administrators. */
const DEAD_LETTERS = 'dead-letters';

type PoolSettings = { connectionTimeoutMillis: number; query_timeout: number; statement_timeout: number };

export interface QueueCount {
  readonly queue: string;
  readonly waiting: number;
  readonly active: number;
  readonly completed: number;
  readonly failed: number;
}

export interface FailedJob {
  readonly id: string;
  readonly queue: string;
  readonly failedAt: Date;
  readonly attempts: number;
  readonly reason: string;
}

/** The job queue in PostgreSQL. A job sent inside a transaction exists exactly when that transaction commits. */
@Injectable()
export class JobsService implements BeforeApplicationShutdown {
  private readonly log = new Logger('Jobs');
  private readonly boss: PgBoss;
  private readonly queues = new Map<string, Promise<void>>();
  private started: Promise<unknown> | undefined;

  constructor(
    @Inject(ENV) env: Env,
    @InjectDataSource() private readonly dataSource: DataSource,
  ) {
    const options: PgBoss.ConstructorOptions & PoolSettings = {
      connectionString: env.DATABASE_URL,
      schema: SCHEMA,
      application_name: 'diffolio jobs',
      max: CONNECTIONS,
      connectionTimeoutMillis: CONNECT_TIMEOUT_MS,
      query_timeout: QUERY_TIMEOUT_MS,
      statement_timeout: QUERY_TIMEOUT_MS,
      schedule: false,
      archiveCompletedAfterSeconds: COMPLETED_KEPT_SECONDS,
      archiveFailedAfterSeconds: FAILED_KEPT_SECONDS,
      maintenanceIntervalSeconds: MAINTENANCE_INTERVAL_SECONDS,
    };
    this.boss = new PgBoss(options);
    // Without a handler an idle connection that breaks would end the process.
    this.boss.on('error', (error) => this.log.error(error.message));
  }

  /**
   * Makes a job inside the caller's transaction.
   *
   * @returns the job's id, or null where `onceInSeconds` says that there is one already
   */
  async send<Payload extends object>(
    manager: EntityManager,
    queue: JobQueue<Payload>,
    data: Payload,
    options: SendOptions = {},
  ): Promise<string | null> {
    await this.ensureQueue(queue);
    const id = await this.boss.send(queue.name, data, {
      ...(options.key !== undefined && { singletonKey: options.key }),
      ...(options.onceInSeconds !== undefined && { singletonSeconds: options.onceInSeconds }),
      db: { executeSql: (text, values: unknown[]) => executeInside(manager, text, values) },
    });
    if (id === null && options.onceInSeconds === undefined) throw new Error(`queue ${queue.name} took no job`);
    return id;
  }

  /** Has `handler` work on the queue's jobs, one by one; a job whose handler throws is tried again later. */
  async work<Payload extends object>(queue: JobQueue<Payload>, handler: JobHandler<Payload>): Promise<void> {
    await this.ensureQueue(queue);
    const options = { batchSize: BATCH_SIZE, pollingIntervalSeconds: POLLING_INTERVAL_SECONDS };
    await this.boss.work<Payload>(queue.name, options, async (jobs) => {
      // Settled singly: one failing job must not fail its batch, and none waits for the slowest of it.
      await Promise.all(jobs.map((job) => this.settle(queue, job, handler)));
    });
  }

  async counts(): Promise<QueueCount[]> {
    await this.start();
    return this.dataSource.query<QueueCount[]>(
      `SELECT name AS queue,
              (count(*) FILTER (WHERE state IN ('created', 'retry')))::int AS waiting,
              (count(*) FILTER (WHERE state = 'active'))::int AS active,
              (count(*) FILTER (WHERE state = 'completed'))::int AS completed,
              (count(*) FILTER (WHERE state = 'failed'))::int AS failed
       FROM ${SCHEMA}.job WHERE name <> $1 AND name NOT LIKE '\\_\\_pgboss%' GROUP BY name ORDER BY name`,
      [DEAD_LETTERS],
    );
  }

  async failures(limit: number): Promise<FailedJob[]> {
    await this.start();
    return this.dataSource.query<FailedJob[]>(
      `SELECT id, name AS queue, completed_on AS "failedAt", retry_count + 1 AS attempts,
              coalesce(output ->> 'message', output -> 'value' ->> 'message', '') AS reason
       FROM ${SCHEMA}.job WHERE state = 'failed' AND name <> $1 ORDER BY completed_on DESC LIMIT $2`,
      [DEAD_LETTERS, limit],
    );
  }

  /** Before the server and the database connections close, so that running jobs can end. */
  async beforeApplicationShutdown(): Promise<void> {
    if (!this.started) return;
    await this.started.catch(() => undefined);
    await this.boss.stop({ graceful: true, wait: true, timeout: STOP_TIMEOUT_MS });
  }

  private start(): Promise<unknown> {
    this.started ??= this.boss
      .start()
      .then(() => this.boss.createQueue(DEAD_LETTERS, { name: DEAD_LETTERS, retryLimit: 0 }));
    return this.started;
  }

  private ensureQueue(queue: JobQueue<object>): Promise<void> {
    const known = this.queues.get(queue.name);
    if (known) return known;
    const made = this.start().then(() =>
      this.boss.createQueue(queue.name, {
        name: queue.name,
        expireInSeconds: queue.expireInSeconds,
        retryLimit: queue.retryLimit,
        retryDelay: queue.retryDelaySeconds,
        retryBackoff: true,
        deadLetter: DEAD_LETTERS,
      }),
    );
    this.queues.set(queue.name, made);
    return made;
  }

  private async settle<Payload extends object>(
    queue: JobQueue<Payload>,
    job: PgBoss.Job<Payload>,
    handler: JobHandler<Payload>,
  ): Promise<void> {
    const begun = performance.now();
    try {
      await handler({ id: job.id, data: job.data });
      await this.boss.complete(queue.name, job.id);
      this.log.log(`${queue.name} ${job.id} done in ${Math.round(performance.now() - begun)} ms`);
    } catch (error) {
      const message = error instanceof Error ? error.message : String(error);
      this.log.warn(`${queue.name} ${job.id} failed: ${message}`);
      await this.boss.fail(queue.name, job.id, { message });
    }
  }
}

/** Runs the queue's own SQL on the connection that holds the caller's transaction. */
async function executeInside(manager: EntityManager, text: string, values: unknown[]): Promise<{ rows: unknown[] }> {
  const runner = manager.queryRunner;
  if (!runner) throw new Error('a job is sent inside a transaction');
  const result = await runner.query(text, values, true);
  return { rows: result.records as unknown[] };
}
