import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import { type DataSource, In } from 'typeorm';
import { Person } from './person.entity.js';

export const ACCOUNT_STATUSES = ['INVITED', 'ACTIVE', 'DISABLED'] as const;
export type AccountStatus = (typeof ACCOUNT_STATUSES)[number];

/** What administrators see of an account, beside the person. */
export interface Account {
  readonly id: string;
  readonly email: string;
  readonly status: AccountStatus;
  readonly lastSeenAt: Date | null;
}

@Injectable()
export class PeopleService {
  constructor(@InjectDataSource() private readonly dataSource: DataSource) {}

  /** Batch function for `loaderFor`: one entry per id, in the order asked, an Error where there is no person. */
  readonly byIds = async (ids: readonly string[]): Promise<(Person | Error)[]> => {
    const found = await this.dataSource.getRepository(Person).findBy({ id: In([...ids]) });
    const byId = new Map(found.map((person) => [person.id, person]));
    return ids.map((id) => byId.get(id) ?? new Error(`no person ${id}`));
  };

  /** Batch function for `loaderFor`: the accounts of people. */
  readonly accountsByIds = async (ids: readonly string[]): Promise<(Account | Error)[]> => {
    const found = await this.dataSource.query<Account[]>(
      `SELECT p.id, p.email,
              CASE WHEN p.disabled_at IS NOT NULL THEN 'DISABLED' WHEN p.password_hash IS NULL THEN 'INVITED'
                   ELSE 'ACTIVE' END AS status,
              (SELECT max(t.created_at) FROM sessions s JOIN refresh_tokens t ON t.session_id = s.id
               WHERE s.person_id = p.id) AS "lastSeenAt"
       FROM people p WHERE p.id = ANY ($1)`,
      [ids],
    );
    const byId = new Map(found.map((account) => [account.id, account]));
    return ids.map((id) => byId.get(id) ?? new Error(`no person ${id}`));
  };

  find(id: string): Promise<Person | null> {
    return this.dataSource.getRepository(Person).findOneBy({ id });
  }

  all(): Promise<Person[]> {
    return this.dataSource.getRepository(Person).find({ order: { name: 'ASC', id: 'ASC' } });
  }
}
