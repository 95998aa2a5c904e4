import { timingSafeEqual } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import { type DataSource, type EntityManager } from 'typeorm';
import { accepted, problem, refused } from '../common/problem.js';
import { isAddress } from '../mail/letters.js';
import { PublicAddressService } from '../mail/public-address.service.js';
import { hashSecretToken, newSecretToken } from '../people/secret-token.js';
import { type LinkOutcome, nameProblems, passwordProblems } from './accounts.service.js';
import { normalizeEmail } from './identity-rules.js';
import { PasswordsService } from './passwords.service.js';

export interface FirstAdministrator {
  readonly email: string;
  readonly name: string;
  readonly password: string;
}

/** Lets whoever starts the server become its first administrator. The link dies with the process and with its use. */
@Injectable()
export class FirstAdministratorService {
  private tokenHash: string | null = null;

  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly passwords: PasswordsService,
    private readonly address: PublicAddressService,
  ) {}

  /** The one-time link to print at the start; null once there is anybody. Call it when the server listens. */
  async link(): Promise<string | null> {
    if (!(await isEmpty(this.dataSource.manager))) return null;
    const token = newSecretToken();
    this.tokenHash = hashSecretToken(token);
    return this.address.linkTo(`/first-administrator/${token}`);
  }

  async create(
    token: string,
    { email: givenEmail, name: givenName, password }: FirstAdministrator,
  ): Promise<LinkOutcome> {
    if (!this.isGood(token) || !(await isEmpty(this.dataSource.manager))) return null;
    const email = normalizeEmail(givenEmail);
    const name = givenName.trim();
    const problems = [
      ...(isAddress(email) ? [] : [problem('BAD_INPUT', 'This is no e-mail address.', 'email')]),
      ...nameProblems(name),
      ...passwordProblems(password, [name, email]),
    ];
    if (problems.length > 0) return refused(...problems);
    const passwordHash = await this.passwords.hash(password);
    return this.dataSource.transaction(async (manager) => {
      await manager.query('LOCK TABLE people IN SHARE ROW EXCLUSIVE MODE');
      if (!(await isEmpty(manager))) return null;
      const [person] = await manager.query<{ id: string }[]>(
        `INSERT INTO people (email, name, roles, password_hash) VALUES ($1, $2, '{ADMINISTRATOR}', $3) RETURNING id`,
        [email, name, passwordHash],
      );
      if (!person) throw new Error('the new person was not returned');
      this.tokenHash = null;
      return accepted({ personId: person.id });
    });
  }

  private isGood(token: string): boolean {
    if (this.tokenHash === null) return false;
    return timingSafeEqual(Buffer.from(this.tokenHash), Buffer.from(hashSecretToken(token)));
  }
}

async function isEmpty(manager: EntityManager): Promise<boolean> {
  const [row] = await manager.query<{ nobody: boolean }[]>('SELECT NOT EXISTS (SELECT FROM people) AS nobody');
  return row?.nobody === true;
}
