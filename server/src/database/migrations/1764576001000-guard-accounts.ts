import { type MigrationInterface, type QueryRunner } from 'typeorm';

/** Counters of failed attempts at secrets; keys that end; who invited whom. */
export class GuardAccounts1764576001000 implements MigrationInterface {
  async up(db: QueryRunner): Promise<void> {
    await db.query(`
      CREATE TABLE throttles (
        key            text NOT NULL CONSTRAINT pk_throttles PRIMARY KEY,
        failures       int NOT NULL CONSTRAINT ck_throttles_failures CHECK (failures >= 0),
        window_ends_at timestamptz NOT NULL,
        blocked_until  timestamptz NOT NULL DEFAULT '-infinity'
      );
      CREATE INDEX ix_throttles_window_ends_at ON throttles (window_ends_at);
      CREATE INDEX ix_sessions_person ON sessions (person_id);
      CREATE INDEX ix_refresh_tokens_session ON refresh_tokens (session_id);
      CREATE INDEX ix_account_tokens_person ON account_tokens (person_id);
      CREATE INDEX ix_api_keys_person ON api_keys (person_id);
      ALTER TABLE api_keys ADD COLUMN expires_at timestamptz;
      ALTER TABLE account_tokens ADD COLUMN issued_by_id uuid
        CONSTRAINT fk_account_tokens_issued_by REFERENCES people ON DELETE SET NULL;`);
  }

  async down(db: QueryRunner): Promise<void> {
    await db.query(`
      ALTER TABLE account_tokens DROP COLUMN issued_by_id;
      ALTER TABLE api_keys DROP COLUMN expires_at;
      DROP INDEX ix_api_keys_person, ix_account_tokens_person, ix_refresh_tokens_session, ix_sessions_person;
      DROP TABLE throttles;`);
  }
}
