import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import { type DataSource, type EntityManager } from 'typeorm';
import { ApiError } from '../common/api-error.js';
import { type Throttle, pauseAfter } from './throttle-rules.js';

/** Thrown instead of looking at an attempt that came too early. */
export class TooManyAttempts extends ApiError {
  constructor(readonly retryAfterSeconds: number) {
    super('RATE_LIMITED', `Too many failed attempts. Try again in ${retryAfterSeconds} s.`);
  }
}

/** Slows down guessing. The counters stand in the database, so that a restart or a second server forgets nothing. */
@Injectable()
export class ThrottleService {
  constructor(@InjectDataSource() private readonly dataSource: DataSource) {}

  /**
   * Lets `attempt` be made if all counters allow it. It counts as failed from its beginning, so that many at once do
   * not slip through together, and is taken back when it succeeds.
   *
   * @param attempt answers null (or false) when it failed
   * @throws {TooManyAttempts}
   */
  async guard<T>(throttles: readonly Throttle[], attempt: () => Promise<T | null | false>): Promise<T | null> {
    await this.count(throttles);
    const result = await attempt();
    if (result === null || result === false) return null;
    await this.forgive(throttles);
    return result;
  }

  /** Counts an attempt at each throttle, or at none. @throws {TooManyAttempts} */
  async count(throttles: readonly Throttle[]): Promise<void> {
    await this.dataSource.transaction(async (manager) => {
      // Always in the order given (account before address), so that two attempts never wait for each other.
      for (const throttle of throttles) await countOne(manager, throttle);
    });
  }

  private async forgive(throttles: readonly Throttle[]): Promise<void> {
    await this.dataSource.transaction(async (manager) => {
      for (const { key, policy } of throttles) {
        if (policy.sliding) await manager.query('DELETE FROM throttles WHERE key = $1', [key]);
        else {
          await manager.query(
            `UPDATE throttles SET failures = greatest(failures - 1, 0), blocked_until = '-infinity' WHERE key = $1`,
            [key],
          );
        }
      }
      await manager.query('DELETE FROM throttles WHERE window_ends_at < now() AND blocked_until < now()');
    });
  }
}

async function countOne(manager: EntityManager, { key, policy }: Throttle): Promise<void> {
  const [counted] = await manager.query<{ failures: number }[]>(
    `INSERT INTO throttles AS t (key, failures, window_ends_at) VALUES ($1, 1, now() + $2 * interval '1 second')
     ON CONFLICT (key) DO UPDATE SET
       failures = CASE WHEN t.window_ends_at <= now() THEN 1 ELSE t.failures + 1 END,
       window_ends_at = CASE WHEN $3 OR t.window_ends_at <= now() THEN excluded.window_ends_at ELSE t.window_ends_at END
     WHERE t.blocked_until <= now()
     RETURNING failures`,
    [key, policy.windowSeconds, policy.sliding],
  );
  if (!counted) {
    const [blocked] = await manager.query<{ seconds: number }[]>(
      'SELECT greatest(ceil(extract(epoch FROM blocked_until - now())), 1)::int AS seconds FROM throttles WHERE key = $1',
      [key],
    );
    throw new TooManyAttempts(blocked?.seconds ?? 1);
  }
  const pause = pauseAfter(counted.failures, policy);
  if (pause === 0) return;
  // A fixed window's pause ends with the window.
  await manager.query(
    `UPDATE throttles SET blocked_until = CASE WHEN $3 THEN now() + $2 * interval '1 second'
       ELSE least(now() + $2 * interval '1 second', window_ends_at) END WHERE key = $1`,
    [key, pause, policy.sliding],
  );
}
