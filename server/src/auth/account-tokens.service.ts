import { Injectable } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import { type DataSource, type EntityManager } from 'typeorm';
import { type RoleName } from '../common/viewer.js';
import { hashSecretToken, newSecretToken } from '../people/secret-token.js';

export type TokenPurpose = 'INVITATION' | 'PASSWORD_RESET';

/** How long a mailed link holds, s. */
export const LIFE_SECONDS: Record<TokenPurpose, number> = { INVITATION: 7 * 24 * 3600, PASSWORD_RESET: 30 * 60 };

export interface TokenHolder {
  readonly personId: string;
  readonly email: string;
  readonly name: string;
  readonly roles: RoleName[];
  readonly expiresAt: Date;
  /** Name of who invited; null where nobody did, or the account is gone. */
  readonly invitedBy: string | null;
}

/** The secrets in mailed links: stored hashed, good for one use, only the newest of a kind. */
@Injectable()
export class AccountTokensService {
  constructor(@InjectDataSource() private readonly dataSource: DataSource) {}

  /** Makes a token; those of the same kind that went out before no longer work. */
  async issue(
    personId: string,
    purpose: TokenPurpose,
    issuedById: string | null = null,
  ): Promise<{ token: string; expiresAt: Date }> {
    const token = newSecretToken();
    return this.dataSource.transaction(async (manager) => {
      await this.endAll(manager, personId, purpose);
      const [row] = await manager.query<{ expiresAt: Date }[]>(
        `INSERT INTO account_tokens (person_id, purpose, token_hash, expires_at, issued_by_id)
         VALUES ($1, $2, $3, now() + $4 * interval '1 second', $5) RETURNING expires_at AS "expiresAt"`,
        [personId, purpose, hashSecretToken(token), LIFE_SECONDS[purpose], issuedById],
      );
      if (!row) throw new Error('the new token was not returned');
      return { token, expiresAt: row.expiresAt };
    });
  }

  /** Whose token this is, without using it up; null when it is unknown, used, too old or of another kind. */
  async holderOf(token: string, purpose: TokenPurpose): Promise<TokenHolder | null> {
    const [holder] = await this.dataSource.query<TokenHolder[]>(
      `SELECT p.id AS "personId", p.email, p.name, p.roles, t.expires_at AS "expiresAt", inviter.name AS "invitedBy"
       FROM account_tokens t JOIN people p ON p.id = t.person_id LEFT JOIN people inviter ON inviter.id = t.issued_by_id
       WHERE t.token_hash = $1 AND t.purpose = $2 AND t.used_at IS NULL AND t.expires_at > now() AND p.disabled_at IS NULL`,
      [hashSecretToken(token), purpose],
    );
    return holder ?? null;
  }

  /** Uses the token up in the caller's transaction. @returns whether it was still good */
  async use(manager: EntityManager, token: string, purpose: TokenPurpose): Promise<boolean> {
    const used = await manager.query<object[]>(
      `WITH used AS (UPDATE account_tokens SET used_at = now()
                     WHERE token_hash = $1 AND purpose = $2 AND used_at IS NULL AND expires_at > now() RETURNING id)
       SELECT id FROM used`,
      [hashSecretToken(token), purpose],
    );
    return used.length > 0;
  }

  async endAll(manager: EntityManager, personId: string, purpose: TokenPurpose): Promise<void> {
    await manager.query(
      'UPDATE account_tokens SET used_at = now() WHERE person_id = $1 AND purpose = $2 AND used_at IS NULL',
      [personId, purpose],
    );
  }
}
