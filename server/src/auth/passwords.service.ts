import { hash, verify } from '@node-rs/argon2';
import { Inject, Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import { type DataSource } from 'typeorm';
import { ApiError } from '../common/api-error.js';
import { ENV } from '../config/config.module.js';
import { type Env } from '../config/env.js';
import { newSecretToken } from '../people/secret-token.js';
import { ConcurrencyLimit } from './concurrency-limit.js';
import { POLICIES } from './throttle-rules.js';
import { ThrottleService } from './throttle.service.js';

/**
 * argon2id with three passes, its memory as set: 64 MiB unless a test says otherwise. OWASP ASVS 5.0.0, appendix C asks for
 * m ≥ 12 MiB at t ≥ 3. About 65 ms of one core.
 */
const PASSES = { timeCost: 3, parallelism: 1 } as const;

/** More at a time would make the memory they take the weak point. */
const MOST_AT_A_TIME = 4;
const LONGEST_QUEUE = 200;

@Injectable()
export class PasswordsService {
  private readonly limit = new ConcurrencyLimit(
    MOST_AT_A_TIME,
    LONGEST_QUEUE,
    () => new ApiError('RATE_LIMITED', 'Too many people are signing in at once. Try again in a moment.'),
  );
  private decoy: Promise<string> | undefined;

  constructor(
    @Inject(ENV) private readonly env: Env,
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly throttle: ThrottleService,
  ) {}

  /** @returns PHC string of argon2id */
  hash(password: string): Promise<string> {
    return this.limit.run(() => hash(password, { ...PASSES, memoryCost: this.env.PASSWORD_MEMORY_KIB }));
  }

  /** Takes as long for a missing hash as for a wrong password, so that the time tells nothing. */
  async matches(passwordHash: string | null, password: string): Promise<boolean> {
    this.decoy ??= this.hash(newSecretToken());
    const decoy = await this.decoy;
    const matches = await this.limit.run(() => verify(passwordHash ?? decoy, password));
    return matches && passwordHash !== null;
  }

  /** Hashes a password that has just been proved again where its hash was made with other parameters. */
  async refresh(personId: string, passwordHash: string, password: string): Promise<void> {
    const current = `$argon2id$v=19$m=${this.env.PASSWORD_MEMORY_KIB},t=${PASSES.timeCost},p=${PASSES.parallelism}$`;
    if (passwordHash.startsWith(current)) return;
    await this.dataSource.query('UPDATE people SET password_hash = $3 WHERE id = $1 AND password_hash = $2', [
      personId,
      passwordHash,
      await this.hash(password),
    ]);
  }

  /**
   * Whether this is the password of somebody who is signed in already and is asked for it again.
   *
   * @throws {TooManyAttempts} after several wrong ones
   */
  async verifyPassword(personId: string, password: string): Promise<boolean> {
    const throttle = { key: `password-again:${personId}`, policy: POLICIES.pair };
    const verified = await this.throttle.guard([throttle], async () => {
      const [person] = await this.dataSource.query<{ passwordHash: string | null }[]>(
        'SELECT password_hash AS "passwordHash" FROM people WHERE id = $1 AND disabled_at IS NULL',
        [personId],
      );
      return this.matches(person?.passwordHash ?? null, password);
    });
    return verified === true;
  }
}
