import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import { type DataSource } from 'typeorm';
import { ApiError } from '../common/api-error.js';
import { isId } from '../common/graphql/node.js';
import { type Outcome, accepted, problem, refused } from '../common/problem.js';
import { type RoleName, type Viewer } from '../common/viewer.js';
import { hashSecretToken, newSecretToken } from '../people/secret-token.js';
import { type ApiKey } from './api-key.js';

/** Begins every key, so that one that leaked is recognised for what it is. */
export const API_KEY_PREFIX = 'dfl_';
const HINT_LENGTH = API_KEY_PREFIX.length + 4;
const LONGEST_NAME = 100;
const MOST_KEYS = 50;
const LONGEST_LIFE_DAYS = 3650;
const COLUMNS = `id, name, hint AS prefix, created_at AS "createdAt", last_used_at AS "lastUsedAt",
  expires_at AS "expiresAt", revoked_at AS "revokedAt"`;

@Injectable()
export class ApiKeysService {
  constructor(@InjectDataSource() private readonly dataSource: DataSource) {}

  ofPerson(personId: string): Promise<ApiKey[]> {
    const select = `SELECT ${COLUMNS} FROM api_keys WHERE person_id = $1 ORDER BY created_at DESC, id`;
    return this.dataSource.query<ApiKey[]>(select, [personId]);
  }

  /**
   * Makes a key. Its secret is in the answer and nowhere else.
   *
   * @param expiresInDays null for a key that ends only by being revoked
   */
  async create(
    personId: string,
    givenName: string,
    expiresInDays: number | null,
  ): Promise<Outcome<{ apiKey: ApiKey; secret: string }>> {
    const name = givenName.trim();
    if (name === '' || name.length > LONGEST_NAME) {
      return refused(problem('BAD_INPUT', `A key has a name of at most ${LONGEST_NAME} characters.`, 'name'));
    }
    if (expiresInDays !== null && (expiresInDays < 1 || expiresInDays > LONGEST_LIFE_DAYS)) {
      return refused(problem('BAD_INPUT', `A key lasts 1 to ${LONGEST_LIFE_DAYS} days.`, 'expiresInDays'));
    }
    const secret = `${API_KEY_PREFIX}${newSecretToken()}`;
    return this.dataSource.transaction(async (manager) => {
      // The owner's row is the lock that keeps two requests from making the same key, or one too many.
      await manager.query('SELECT FROM people WHERE id = $1 FOR UPDATE', [personId]);
      const inUse = await manager.query<{ name: string }[]>(
        'SELECT name FROM api_keys WHERE person_id = $1 AND revoked_at IS NULL AND (expires_at > now()) IS NOT FALSE',
        [personId],
      );
      if (inUse.some((key) => key.name === name)) {
        return refused(problem('DUPLICATE', 'One of your keys has this name already.', 'name'));
      }
      if (inUse.length >= MOST_KEYS) {
        return refused(problem('WRONG_STATE', `You have ${MOST_KEYS} keys; revoke one first.`));
      }
      const [apiKey] = await manager.query<ApiKey[]>(
        `INSERT INTO api_keys (person_id, name, hint, token_hash, expires_at)
         VALUES ($1, $2, $3, $4, now() + $5 * interval '1 day') RETURNING ${COLUMNS}`,
        [personId, name, secret.slice(0, HINT_LENGTH), hashSecretToken(secret), expiresInDays],
      );
      if (!apiKey) throw new Error('the new key was not returned');
      return accepted({ apiKey, secret });
    });
  }

  /** Ends a key at once; ending it twice changes nothing. @throws {ApiError} NOT_FOUND for what is not the person's key */
  async revoke(personId: string, id: string): Promise<ApiKey> {
    const revoked = isId(id)
      ? await this.dataSource.query<ApiKey[]>(
          `WITH revoked AS (UPDATE api_keys SET revoked_at = coalesce(revoked_at, now())
                            WHERE id = $1 AND person_id = $2 RETURNING *)
           SELECT ${COLUMNS} FROM revoked`,
          [id, personId],
        )
      : [];
    if (!revoked[0]) throw new ApiError('NOT_FOUND', 'You have no such key.');
    return revoked[0];
  }

  /** Whom a key speaks for; null when it is unknown, revoked or over, or its owner is disabled. */
  async viewerOf(secret: string): Promise<Viewer | null> {
    const [found] = await this.dataSource.query<{ keyId: string; stale: boolean; id: string; roles: RoleName[] }[]>(
      `SELECT k.id AS "keyId", coalesce(k.last_used_at < now() - interval '1 minute', true) AS stale, p.id, p.roles
       FROM api_keys k JOIN people p ON p.id = k.person_id
       WHERE k.token_hash = $1 AND k.revoked_at IS NULL AND (k.expires_at > now()) IS NOT FALSE
         AND p.disabled_at IS NULL`,
      [hashSecretToken(secret)],
    );
    if (!found) return null;
    // Once a minute is exact enough, and keeps a busy key from writing with every reading.
    if (found.stale)
      await this.dataSource.query('UPDATE api_keys SET last_used_at = now() WHERE id = $1', [found.keyId]);
    return { id: found.id, roles: found.roles, viaApiKey: true };
  }
}
