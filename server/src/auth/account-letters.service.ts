import { Injectable, type OnModuleInit } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import { type DataSource, type EntityManager } from 'typeorm';
import { type RoleName } from '../common/viewer.js';
import { type Job, type SendOptions, jobQueue } from '../jobs/job-queue.js';
import { JobsService } from '../jobs/jobs.service.js';
import { type Letter } from '../mail/letters.js';
import { MailService } from '../mail/mail.service.js';
import { PublicAddressService } from '../mail/public-address.service.js';
import { AccountTokensService, LIFE_SECONDS, type TokenPurpose } from './account-tokens.service.js';

interface AccountLetter {
  readonly email: string;
  readonly purpose: TokenPurpose;
  readonly issuedById: string | null;
}

const ACCOUNT_LETTER = jobQueue<AccountLetter>('account.letter', { expireInSeconds: 30 });

/** One reset letter a minute to one address is enough. */
const RESET_ONCE_IN_SECONDS = 60;

/**
 * Mails the links that open accounts. The secret is made when the letter is sent, so that it is nowhere stored but
 * hashed, the job queue included. Whether an address has an account is looked up here, after the answer, so that neither
 * the answer nor its time tells.
 */
@Injectable()
export class AccountLettersService implements OnModuleInit {
  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly jobs: JobsService,
    private readonly mail: MailService,
    private readonly tokens: AccountTokensService,
    private readonly address: PublicAddressService,
  ) {}

  async onModuleInit(): Promise<void> {
    await this.jobs.work(ACCOUNT_LETTER, (job) => this.send(job));
  }

  async enqueue(manager: EntityManager, letter: AccountLetter): Promise<void> {
    const options: SendOptions =
      letter.purpose === 'PASSWORD_RESET' ? { key: letter.email, onceInSeconds: RESET_ONCE_IN_SECONDS } : {};
    await this.jobs.send(manager, ACCOUNT_LETTER, letter, options);
  }

  private async send({ id, data: { email, purpose, issuedById } }: Job<AccountLetter>): Promise<void> {
    const [person] = await this.dataSource.query<{ id: string; roles: RoleName[]; hasPassword: boolean }[]>(
      `SELECT id, roles, password_hash IS NOT NULL AS "hasPassword" FROM people
       WHERE email = $1 AND disabled_at IS NULL`,
      [email],
    );
    // An invitation is for who has no password yet, a reset for who has one.
    if (!person || person.hasPassword !== (purpose === 'PASSWORD_RESET')) return;
    const { token, expiresAt } = await this.tokens.issue(person.id, purpose, issuedById);
    await this.mail.deliver(this.letter(email, purpose, token, expiresAt, person.roles), id);
  }

  private letter(to: string, purpose: TokenPurpose, token: string, expiresAt: Date, roles: RoleName[]): Letter {
    if (purpose === 'PASSWORD_RESET') {
      const link = this.address.linkTo(`/reset-password/${token}`);
      return { to, template: 'passwordReset', values: { link, minutes: String(LIFE_SECONDS.PASSWORD_RESET / 60) } };
    }
    const link = this.address.linkTo(`/invitation/${token}`);
    const until = new Intl.DateTimeFormat('en-GB', { dateStyle: 'long', timeZone: 'UTC' }).format(expiresAt);
    return { to, template: 'invitation', values: { link, roles: inWords(roles), until } };
  }
}

function inWords(roles: readonly RoleName[]): string {
  return new Intl.ListFormat('en-GB').format(roles.map((role) => role.toLowerCase()));
}
