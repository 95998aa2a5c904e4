import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import { type DataSource, type EntityManager } from 'typeorm';
import { ApiError } from '../common/api-error.js';
import { isId } from '../common/graphql/node.js';
import { type Outcome, accepted, problem, refused } from '../common/problem.js';
import { type SheetSubscription } from './sheet-subscription.js';

export interface Subscriber {
  readonly personId: string;
  readonly email: string;
  readonly name: string;
}

const COLUMNS = 'data_sheet_id AS "sheetId", created_at AS since';

/** Who is told about a sheet. */
@Injectable()
export class SubscriptionsService {
  constructor(@InjectDataSource() private readonly dataSource: DataSource) {}

  async ofPerson(personId: string): Promise<SheetSubscription[]> {
    return this.dataSource.query<SheetSubscription[]>(
      `SELECT ${COLUMNS} FROM subscriptions WHERE person_id = $1 ORDER BY created_at, data_sheet_id`,
      [personId],
    );
  }

  /** Asking twice is asking once. @throws {ApiError} NOT_FOUND when there is no such sheet */
  async subscribe(personId: string, sheetId: string): Promise<SheetSubscription> {
    return this.dataSource.transaction(async (manager) => {
      await requireSheet(manager, sheetId);
      const insert = 'INSERT INTO subscriptions (person_id, data_sheet_id) VALUES ($1, $2) ON CONFLICT DO NOTHING';
      await manager.query(insert, [personId, sheetId]);
      const [subscription] = await manager.query<SheetSubscription[]>(
        `SELECT ${COLUMNS} FROM subscriptions WHERE person_id = $1 AND data_sheet_id = $2`,
        [personId, sheetId],
      );
      if (!subscription) throw new Error('a subscription vanished inside its transaction');
      return subscription;
    });
  }

  async unsubscribe(personId: string, sheetId: string): Promise<Outcome<SheetSubscription>> {
    return this.dataSource.transaction(async (manager) => {
      await requireSheet(manager, sheetId);
      const [ended] = await manager.query<SheetSubscription[]>(
        `WITH ended AS (DELETE FROM subscriptions WHERE person_id = $1 AND data_sheet_id = $2 RETURNING *)
         SELECT ${COLUMNS} FROM ended`,
        [personId, sheetId],
      );
      return ended ? accepted(ended) : refused(problem('WRONG_STATE', 'You do not follow this sheet.'));
    });
  }

  /** Everybody who follows the sheet and may still sign in. */
  async subscribersOf(manager: EntityManager, sheetId: string): Promise<Subscriber[]> {
    return manager.query<Subscriber[]>(
      `SELECT p.id AS "personId", p.email, p.name
       FROM subscriptions s JOIN people p ON p.id = s.person_id
       WHERE s.data_sheet_id = $1 AND p.disabled_at IS NULL ORDER BY p.email`,
      [sheetId],
    );
  }
}

async function requireSheet(manager: EntityManager, sheetId: string): Promise<void> {
  const found = isId(sheetId) ? await manager.query<object[]>('SELECT FROM data_sheets WHERE id = $1', [sheetId]) : [];
  if (found.length === 0) throw new ApiError('NOT_FOUND', 'There is no such data sheet.');
}
