import { Injectable, Logger } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import { type DataSource } from 'typeorm';
import { hashSecretToken } from '../people/secret-token.js';
import { AccessTokensService } from './access-tokens.service.js';
import { normalizeEmail } from './identity-rules.js';
import { PasswordsService } from './passwords.service.js';
import { type OpenSession, SessionsService } from './sessions.service.js';
import { POLICIES, type Throttle, addressOf, networkOf } from './throttle-rules.js';
import { ThrottleService } from './throttle.service.js';

export interface SignInAttempt {
  readonly email: string;
  readonly password: string;
  /** Of the connection, not of a header that the caller writes. */
  readonly address: string;
  /** The mark that an earlier sign-in left on this device. */
  readonly deviceToken: string | undefined;
}

interface Candidate {
  readonly id: string;
  readonly passwordHash: string | null;
}

@Injectable()
export class SignInService {
  private readonly log = new Logger('SignIn');

  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly passwords: PasswordsService,
    private readonly sessions: SessionsService,
    private readonly tokens: AccessTokensService,
    private readonly throttle: ThrottleService,
  ) {}

  /**
   * Opens a session; null when e-mail and password do not belong together, which an unknown e-mail does not either.
   *
   * @throws {TooManyAttempts}
   */
  async signIn({ email: given, password, address, deviceToken }: SignInAttempt): Promise<OpenSession | null> {
    const email = normalizeEmail(given);
    const candidate = await this.candidate(email);
    const device = await this.tokens.deviceOf(deviceToken, candidate?.id ?? null);
    const proved = await this.throttle.guard(throttlesOf(email, address, device), async () =>
      (await this.passwords.matches(candidate?.passwordHash ?? null, password)) ? candidate : null,
    );
    if (!proved?.passwordHash) {
      this.log.warn(`refused a sign-in from ${address}`);
      return null;
    }
    await this.passwords.refresh(proved.id, proved.passwordHash, password);
    return this.sessions.open(proved.id);
  }

  private async candidate(email: string): Promise<Candidate | null> {
    const [candidate] = await this.dataSource.query<Candidate[]>(
      'SELECT id, password_hash AS "passwordHash" FROM people WHERE email = $1 AND disabled_at IS NULL',
      [email],
    );
    return candidate ?? null;
  }
}

/**
 * What slows an attempt down. A device that its owner has signed in from answers only for itself: whoever guesses from
 * elsewhere cannot lock the owner out.
 */
function throttlesOf(email: string, address: string, device: string | null): Throttle[] {
  if (device !== null) return [{ key: `sign-in:device:${device}`, policy: POLICIES.pair }];
  // Hashed, because people type their password into the wrong field.
  const account = hashSecretToken(email);
  return [
    { key: `sign-in:${account}:${networkOf(address)}`, policy: POLICIES.pair },
    { key: `sign-in:${account}`, policy: POLICIES.account },
    { key: `sign-in-from:${addressOf(address)}`, policy: POLICIES.address },
  ];
}
