import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import { type DataSource, type EntityManager } from 'typeorm';
import { ApiError } from '../common/api-error.js';
import { isId } from '../common/graphql/node.js';
import { type Outcome, type Problem, accepted, problem, refused } from '../common/problem.js';
import { type RoleName } from '../common/viewer.js';
import { isAddress } from '../mail/letters.js';
import { Person } from '../people/person.entity.js';
import { AccountLettersService } from './account-letters.service.js';
import { leavesNoAdministrator } from './account-rules.js';
import { AccountTokensService } from './account-tokens.service.js';
import { LONGEST_PERSON_NAME, normalizeEmail } from './identity-rules.js';
import { passwordRefusal } from './password-rules.js';
import { PasswordsService } from './passwords.service.js';
import { SessionsService } from './sessions.service.js';

export interface AccountUpdate {
  readonly roles?: readonly RoleName[] | null | undefined;
  readonly disabled?: boolean | null | undefined;
}

/** What became of a mailed link: the person, problems to mend, or null when the link is not good (any longer). */
export type LinkOutcome = Outcome<{ personId: string }> | null;

/** How accounts come to be, change and are recovered. */
@Injectable()
export class AccountsService {
  constructor(
    @InjectDataSource() private readonly dataSource: DataSource,
    private readonly tokens: AccountTokensService,
    private readonly letters: AccountLettersService,
    private readonly passwords: PasswordsService,
    private readonly sessions: SessionsService,
  ) {}

  /** Makes an account without a password and mails its link; for one whose invitation is still open, mails a new one. */
  async invite(invitedById: string, givenEmail: string, roles: readonly RoleName[]): Promise<Outcome<Person>> {
    const email = normalizeEmail(givenEmail);
    if (!isAddress(email)) return refused(problem('BAD_INPUT', 'This is no e-mail address.', 'email'));
    if (roles.length === 0) return refused(problem('BAD_INPUT', 'A person has at least one role.', 'roles'));
    return this.dataSource.transaction(async (manager) => {
      const [row] = await manager.query<{ id: string }[]>(
        `INSERT INTO people (email, name, roles) VALUES ($1, $2, $3)
         ON CONFLICT (email) DO UPDATE SET roles = excluded.roles
           WHERE people.password_hash IS NULL AND people.disabled_at IS NULL
         RETURNING id`,
        [email, email.split('@')[0], [...new Set(roles)]],
      );
      if (!row) return refused(problem('DUPLICATE', 'There is an account with this address already.', 'email'));
      await this.letters.enqueue(manager, { email, purpose: 'INVITATION', issuedById: invitedById });
      return accepted(await manager.findOneByOrFail(Person, { id: row.id }));
    });
  }

  /** Changes roles, disables or enables. A disabled person's sessions end; the last administrator stays one. */
  async update(id: string, update: AccountUpdate): Promise<Outcome<Person>> {
    return this.dataSource.transaction(async (manager) => {
      const administrators = await lockActiveAdministrators(manager);
      const person = isId(id)
        ? await manager.findOne(Person, { where: { id }, lock: { mode: 'pessimistic_write' } })
        : null;
      if (!person) throw new ApiError('NOT_FOUND', 'There is no such person.');
      const change = {
        roles: [...new Set(update.roles ?? person.roles)],
        disabled: update.disabled ?? person.disabledAt !== null,
      };
      if (change.roles.length === 0) return refused(problem('BAD_INPUT', 'A person has at least one role.', 'roles'));
      if (leavesNoAdministrator(id, change, administrators)) {
        return refused(problem('WRONG_STATE', 'This is the last administrator; make another one first.'));
      }
      if (change.disabled) await this.sessions.endAll(manager, id);
      person.roles = change.roles;
      person.disabledAt = change.disabled ? (person.disabledAt ?? new Date()) : null;
      return accepted(await manager.save(person));
    });
  }

  /** Whether or not there is such an account: a letter goes out to it, and nothing tells the caller. */
  async requestPasswordReset(email: string): Promise<void> {
    await this.dataSource.transaction((manager) =>
      this.letters.enqueue(manager, { email: normalizeEmail(email), purpose: 'PASSWORD_RESET', issuedById: null }),
    );
  }

  async acceptInvitation(token: string, givenName: string, password: string): Promise<LinkOutcome> {
    const holder = await this.tokens.holderOf(token, 'INVITATION');
    if (!holder) return null;
    const name = givenName.trim();
    const problems = [...nameProblems(name), ...passwordProblems(password, [name, holder.email])];
    if (problems.length > 0) return refused(...problems);
    const passwordHash = await this.passwords.hash(password);
    return this.dataSource.transaction(async (manager) => {
      if (!(await this.tokens.use(manager, token, 'INVITATION'))) return null;
      await manager.update(Person, holder.personId, { name, passwordHash });
      return accepted({ personId: holder.personId });
    });
  }

  /** Sets a new password by a mailed link and ends all sessions, whoever began them. */
  async resetPassword(token: string, password: string): Promise<LinkOutcome> {
    const holder = await this.tokens.holderOf(token, 'PASSWORD_RESET');
    if (!holder) return null;
    const problems = passwordProblems(password, [holder.name, holder.email]);
    if (problems.length > 0) return refused(...problems);
    const passwordHash = await this.passwords.hash(password);
    return this.dataSource.transaction(async (manager) => {
      if (!(await this.tokens.use(manager, token, 'PASSWORD_RESET'))) return null;
      await manager.update(Person, holder.personId, { passwordHash });
      await this.sessions.endAll(manager, holder.personId);
      return accepted({ personId: holder.personId });
    });
  }

  /** @param keptSessionId the session that asks; all others end */
  async changePassword(
    personId: string,
    current: string,
    password: string,
    keptSessionId: string | null,
  ): Promise<Outcome<{ personId: string }>> {
    if (!(await this.passwords.verifyPassword(personId, current))) {
      return refused(problem('WRONG_PASSWORD', 'This is not your password.', 'currentPassword'));
    }
    const person = await this.dataSource.manager.findOneByOrFail(Person, { id: personId });
    const problems = passwordProblems(password, [person.name, person.email]);
    if (problems.length > 0) return refused(...problems);
    const passwordHash = await this.passwords.hash(password);
    return this.dataSource.transaction(async (manager) => {
      await manager.update(Person, personId, { passwordHash });
      await this.sessions.endAll(manager, personId, keptSessionId);
      await this.tokens.endAll(manager, personId, 'PASSWORD_RESET');
      return accepted({ personId });
    });
  }
}

/** Two administrators who demote each other at once must not both succeed: the second waits and sees the first. */
async function lockActiveAdministrators(manager: EntityManager): Promise<string[]> {
  const rows = await manager.query<{ id: string }[]>(
    `SELECT id FROM people WHERE 'ADMINISTRATOR' = ANY (roles) AND disabled_at IS NULL AND password_hash IS NOT NULL
     ORDER BY id FOR UPDATE`,
  );
  return rows.map(({ id }) => id);
}

export function nameProblems(name: string): Problem[] {
  if (name !== '' && name.length <= LONGEST_PERSON_NAME) return [];
  return [problem('BAD_INPUT', `A name has 1 to ${LONGEST_PERSON_NAME} characters.`, 'name')];
}

export function passwordProblems(password: string, context: readonly string[]): Problem[] {
  const refusal = passwordRefusal(password, context);
  return refusal === null ? [] : [problem('BAD_INPUT', refusal, 'password')];
}
