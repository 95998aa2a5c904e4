import { Injectable, Logger } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import { type DataSource, type EntityManager } from 'typeorm';
import { type RoleName, type Viewer } from '../common/viewer.js';
import { hashSecretToken, newSecretToken } from '../people/secret-token.js';

/** A session ends after this time, however much it is used. */
export const SESSION_DAYS = 30;

export interface OpenSession {
  readonly sessionId: string;
  readonly personId: string;
  /** Good for one refresh. */
  readonly refreshToken: string;
}

export interface SessionEntry {
  readonly id: string;
  readonly createdAt: Date;
  readonly lastUsedAt: Date;
  readonly expiresAt: Date;
}

/** Sessions and their rotating refresh tokens. All times are the database's. */
@Injectable()
export class SessionsService {
  private readonly log = new Logger('Sessions');

  constructor(@InjectDataSource() private readonly dataSource: DataSource) {}

  async open(personId: string): Promise<OpenSession> {
    return this.dataSource.transaction(async (manager) => {
      await manager.query('DELETE FROM sessions WHERE person_id = $1 AND expires_at < now()', [personId]);
      const [session] = await manager.query<{ id: string }[]>(
        `INSERT INTO sessions (person_id, expires_at) VALUES ($1, now() + $2 * interval '1 day') RETURNING id`,
        [personId, SESSION_DAYS],
      );
      if (!session) throw new Error('the new session was not returned');
      return { sessionId: session.id, personId, refreshToken: await addToken(manager, session.id) };
    });
  }

  /**
   * Exchanges a refresh token for the next one; null when it opens nothing. A token that comes a second time has been
   * copied by somebody, nobody knows which of the two is the owner, and the whole session ends.
   */
  async rotate(refreshToken: string): Promise<OpenSession | null> {
    return this.dataSource.transaction(async (manager) => {
      const [used] = await manager.query<{ sessionId: string }[]>(
        `WITH used AS (UPDATE refresh_tokens SET used_at = now() WHERE token_hash = $1 AND used_at IS NULL
                       RETURNING session_id)
         SELECT session_id AS "sessionId" FROM used`,
        [hashSecretToken(refreshToken)],
      );
      if (!used) {
        await this.endReused(manager, refreshToken);
        return null;
      }
      const [session] = await manager.query<{ personId: string }[]>(
        `SELECT s.person_id AS "personId" FROM sessions s JOIN people p ON p.id = s.person_id
         WHERE s.id = $1 AND s.ended_at IS NULL AND s.expires_at > now() AND p.disabled_at IS NULL`,
        [used.sessionId],
      );
      if (!session) return null;
      return {
        sessionId: used.sessionId,
        personId: session.personId,
        refreshToken: await addToken(manager, used.sessionId),
      };
    });
  }

  /** Whom an access token of this session speaks for; null once the session has ended or its person is disabled. */
  async viewerOf(sessionId: string, personId: string): Promise<Viewer | null> {
    const [person] = await this.dataSource.query<{ roles: RoleName[] }[]>(
      `SELECT p.roles FROM sessions s JOIN people p ON p.id = s.person_id
       WHERE s.id = $1 AND p.id = $2 AND s.ended_at IS NULL AND s.expires_at > now() AND p.disabled_at IS NULL`,
      [sessionId, personId],
    );
    return person ? { id: personId, roles: person.roles, viaApiKey: false } : null;
  }

  /** The session that a refresh token belongs to, used or not. */
  async idOf(refreshToken: string): Promise<string | null> {
    const [token] = await this.dataSource.query<{ sessionId: string }[]>(
      'SELECT session_id AS "sessionId" FROM refresh_tokens WHERE token_hash = $1',
      [hashSecretToken(refreshToken)],
    );
    return token?.sessionId ?? null;
  }

  ofPerson(personId: string): Promise<SessionEntry[]> {
    return this.dataSource.query<SessionEntry[]>(
      `SELECT s.id, s.created_at AS "createdAt", s.expires_at AS "expiresAt",
              coalesce(max(t.created_at), s.created_at) AS "lastUsedAt"
       FROM sessions s LEFT JOIN refresh_tokens t ON t.session_id = s.id
       WHERE s.person_id = $1 AND s.ended_at IS NULL AND s.expires_at > now()
       GROUP BY s.id ORDER BY s.created_at DESC`,
      [personId],
    );
  }

  async endByToken(refreshToken: string): Promise<void> {
    const sessionId = await this.idOf(refreshToken);
    if (sessionId)
      await this.dataSource.query('UPDATE sessions SET ended_at = now() WHERE id = $1 AND ended_at IS NULL', [
        sessionId,
      ]);
  }

  /** @returns whether the person had that session */
  async end(personId: string, sessionId: string): Promise<boolean> {
    const ended = await this.dataSource.query<object[]>(
      `WITH ended AS (UPDATE sessions SET ended_at = now() WHERE id = $1 AND person_id = $2 AND ended_at IS NULL
                      RETURNING id)
       SELECT id FROM ended`,
      [sessionId, personId],
    );
    return ended.length > 0;
  }

  /** Ends all sessions of a person, in the caller's transaction, but the one to keep. */
  async endAll(manager: EntityManager, personId: string, keep: string | null = null): Promise<void> {
    await manager.query(
      'UPDATE sessions SET ended_at = now() WHERE person_id = $1 AND ended_at IS NULL AND id IS DISTINCT FROM $2::uuid',
      [personId, keep],
    );
  }

  private async endReused(manager: EntityManager, refreshToken: string): Promise<void> {
    const reused = await manager.query<{ id: string }[]>(
      `WITH ended AS (UPDATE sessions SET ended_at = now() WHERE ended_at IS NULL
                      AND id = (SELECT session_id FROM refresh_tokens WHERE token_hash = $1) RETURNING id)
       SELECT id FROM ended`,
      [hashSecretToken(refreshToken)],
    );
    for (const { id } of reused) this.log.warn(`session ${id} ended: its refresh token was used twice`);
  }
}

async function addToken(manager: EntityManager, sessionId: string): Promise<string> {
  const token = newSecretToken();
  await manager.query('INSERT INTO refresh_tokens (session_id, token_hash) VALUES ($1, $2)', [
    sessionId,
    hashSecretToken(token),
  ]);
  return token;
}
