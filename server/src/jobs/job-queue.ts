/**
 * A kind of work that outlives a request. Its owner declares it once as a constant; `Payload` is what one job carries.
 *
 * Handlers run at least once: a job whose server dies, or that outlives `expireInSeconds`, runs again.
 */
export interface JobQueue<Payload extends object> {
  readonly name: string;
  readonly expireInSeconds: number;
  readonly retryLimit: number;
  /** First pause before a retry; each further one about doubles. */
  readonly retryDelaySeconds: number;
  /** Carries the type of the payload; never set. */
  readonly payload?: Payload;
}

export interface Job<Payload extends object> {
  /** Stays the same when the job runs again. */
  readonly id: string;
  readonly data: Payload;
}

export type JobHandler<Payload extends object> = (job: Job<Payload>) => Promise<void>;

export interface SendOptions {
  /** With `onceInSeconds`: a second job with this key within that time is not made. */
  readonly key?: string;
  readonly onceInSeconds?: number;
}

export function jobQueue<Payload extends object>(
  name: string,
  limits: Partial<Omit<JobQueue<Payload>, 'name' | 'payload'>> = {},
): JobQueue<Payload> {
  return { name, expireInSeconds: 60, retryLimit: 8, retryDelaySeconds: 5, ...limits };
}
