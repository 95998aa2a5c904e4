import { type MigrationInterface, type QueryRunner } from 'typeorm';

const PEOPLE = `
  CREATE TABLE people (
    id            uuid NOT NULL DEFAULT gen_random_uuid() CONSTRAINT pk_people PRIMARY KEY,
    email         text NOT NULL CONSTRAINT ck_people_email CHECK (email = lower(email) AND email LIKE '%_@_%'),
    name          text NOT NULL CONSTRAINT ck_people_name CHECK (name <> ''),
    orcid         text,
    roles         text[] NOT NULL CONSTRAINT ck_people_roles
                  CHECK (roles <@ ARRAY['MODELLER', 'RESEARCHER', 'EDITOR', 'ADMINISTRATOR']),
    password_hash text,
    disabled_at   timestamptz,
    created_at    timestamptz NOT NULL DEFAULT now(),
    CONSTRAINT uq_people_email UNIQUE (email)
  );
  CREATE TABLE account_tokens (
    id         uuid NOT NULL DEFAULT gen_random_uuid() CONSTRAINT pk_account_tokens PRIMARY KEY,
    person_id  uuid NOT NULL CONSTRAINT fk_account_tokens_person REFERENCES people ON DELETE CASCADE,
    purpose    text NOT NULL CONSTRAINT ck_account_tokens_purpose CHECK (purpose IN ('INVITATION', 'PASSWORD_RESET')),
    token_hash text NOT NULL,
    expires_at timestamptz NOT NULL,
    used_at    timestamptz,
    created_at timestamptz NOT NULL DEFAULT now(),
    CONSTRAINT uq_account_tokens_hash UNIQUE (token_hash)
  );
  CREATE TABLE sessions (
    id         uuid NOT NULL DEFAULT gen_random_uuid() CONSTRAINT pk_sessions PRIMARY KEY,
    person_id  uuid NOT NULL CONSTRAINT fk_sessions_person REFERENCES people ON DELETE CASCADE,
    created_at timestamptz NOT NULL DEFAULT now(),
    expires_at timestamptz NOT NULL,
    ended_at   timestamptz
  );
  CREATE TABLE refresh_tokens (
    id         uuid NOT NULL DEFAULT gen_random_uuid() CONSTRAINT pk_refresh_tokens PRIMARY KEY,
    session_id uuid NOT NULL CONSTRAINT fk_refresh_tokens_session REFERENCES sessions ON DELETE CASCADE,
    token_hash text NOT NULL,
    created_at timestamptz NOT NULL DEFAULT now(),
    used_at    timestamptz,
    CONSTRAINT uq_refresh_tokens_hash UNIQUE (token_hash)
  );
  CREATE TABLE api_keys (
    id           uuid NOT NULL DEFAULT gen_random_uuid() CONSTRAINT pk_api_keys PRIMARY KEY,
    person_id    uuid NOT NULL CONSTRAINT fk_api_keys_person REFERENCES people ON DELETE CASCADE,
    name         text NOT NULL CONSTRAINT ck_api_keys_name CHECK (name <> ''),
    hint         text NOT NULL,
    token_hash   text NOT NULL,
    created_at   timestamptz NOT NULL DEFAULT now(),
    last_used_at timestamptz,
    revoked_at   timestamptz,
    CONSTRAINT uq_api_keys_hash UNIQUE (token_hash)
  );`;

const SUBSTANCES = `
  CREATE FUNCTION cas_number_is_valid(cas text) RETURNS boolean LANGUAGE plpgsql IMMUTABLE STRICT AS $$
  DECLARE
    digits text := replace(cas, '-', '');
    total int := 0;
  BEGIN
    IF cas !~ '^[1-9][0-9]{1,6}-[0-9]{2}-[0-9]$' THEN RETURN false; END IF;
    FOR i IN 1 .. length(digits) - 1 LOOP
      total := total + i * substr(digits, length(digits) - i, 1)::int;
    END LOOP;
    RETURN total % 10 = right(digits, 1)::int;
  END $$;
  CREATE TABLE substances (
    id                   uuid NOT NULL DEFAULT gen_random_uuid() CONSTRAINT pk_substances PRIMARY KEY,
    name                 text NOT NULL CONSTRAINT ck_substances_name CHECK (name <> ''),
    formula              text NOT NULL,
    synonyms             text[] NOT NULL DEFAULT '{}',
    cas_number           text CONSTRAINT ck_substances_cas_number CHECK (cas_number_is_valid(cas_number)),
    inchi                text,
    molar_mass_kg_mol    double precision NOT NULL
                         CONSTRAINT ck_substances_molar_mass CHECK (molar_mass_kg_mol > 0 AND molar_mass_kg_mol < 10),
    constants            jsonb NOT NULL DEFAULT '[]',
    composition          jsonb,
    cautions             jsonb NOT NULL DEFAULT '[]',
    created_by_id        uuid CONSTRAINT fk_substances_created_by REFERENCES people,
    lock_version         int NOT NULL DEFAULT 1,
    created_at           timestamptz NOT NULL DEFAULT now(),
    CONSTRAINT uq_substances_cas_number UNIQUE (cas_number)
  );
  CREATE UNIQUE INDEX uq_substances_name ON substances (lower(name));
  CREATE TABLE gas_pairs (
    id         uuid NOT NULL DEFAULT gen_random_uuid() CONSTRAINT pk_gas_pairs PRIMARY KEY,
    first_id   uuid NOT NULL CONSTRAINT fk_gas_pairs_first REFERENCES substances,
    second_id  uuid NOT NULL CONSTRAINT fk_gas_pairs_second REFERENCES substances,
    created_at timestamptz NOT NULL DEFAULT now(),
    CONSTRAINT ck_gas_pairs_distinct CHECK (first_id <> second_id)
  );
  CREATE UNIQUE INDEX uq_gas_pairs_unordered ON gas_pairs (least(first_id, second_id), greatest(first_id, second_id));`;

const SERIES = `
  CREATE TABLE files (
    id             uuid NOT NULL DEFAULT gen_random_uuid() CONSTRAINT pk_files PRIMARY KEY,
    name           text NOT NULL,
    media_type     text NOT NULL,
    size_bytes     bigint NOT NULL CONSTRAINT ck_files_size CHECK (size_bytes >= 0),
    sha256         char(64) NOT NULL,
    storage_key    text NOT NULL,
    uploaded_by_id uuid NOT NULL CONSTRAINT fk_files_uploaded_by REFERENCES people,
    created_at     timestamptz NOT NULL DEFAULT now()
  );
  CREATE TABLE series (
    id                          uuid NOT NULL DEFAULT gen_random_uuid() CONSTRAINT pk_series PRIMARY KEY,
    pair_id                     uuid NOT NULL CONSTRAINT fk_series_pair REFERENCES gas_pairs,
    title                       text NOT NULL CONSTRAINT ck_series_title CHECK (title <> ''),
    source                      text NOT NULL CONSTRAINT ck_series_source CHECK (source <> ''),
    method                      text NOT NULL CONSTRAINT ck_series_method CHECK (method <> ''),
    apparatus                   text,
    data_origin                 text NOT NULL DEFAULT 'TABLE' CONSTRAINT ck_series_data_origin
                                CHECK (data_origin IN ('TABLE', 'GRAPH', 'SMOOTHED', 'EQUATION', 'TUBE_RUN')),
    status                      text NOT NULL DEFAULT 'DRAFT' CONSTRAINT ck_series_status
                                CHECK (status IN ('DRAFT', 'SUBMITTED', 'RETURNED', 'ACCEPTED', 'RETIRED')),
    common_relative_uncertainty double precision CONSTRAINT ck_series_common_uncertainty
                                CHECK (common_relative_uncertainty >= 0 AND common_relative_uncertainty < 1),
    same_data_as_id             uuid CONSTRAINT fk_series_same_data_as REFERENCES series,
    file_id                     uuid CONSTRAINT fk_series_file REFERENCES files,
    warnings                    jsonb NOT NULL DEFAULT '[]',
    created_by_id               uuid NOT NULL CONSTRAINT fk_series_created_by REFERENCES people,
    submitted_by_id             uuid CONSTRAINT fk_series_submitted_by REFERENCES people,
    lock_version                int NOT NULL DEFAULT 1,
    created_at                  timestamptz NOT NULL DEFAULT now(),
    CONSTRAINT ck_series_not_itself CHECK (same_data_as_id <> id)
  );
  CREATE INDEX ix_series_pair ON series (pair_id);
  CREATE TABLE series_points (
    series_id                 uuid NOT NULL CONSTRAINT fk_series_points_series REFERENCES series ON DELETE CASCADE,
    index                     int NOT NULL CONSTRAINT ck_series_points_index CHECK (index >= 0),
    temperature_k             double precision NOT NULL CONSTRAINT ck_series_points_temperature
                              CHECK (temperature_k > 0 AND temperature_k < 'Infinity'),
    pressure_pa               double precision NOT NULL CONSTRAINT ck_series_points_pressure
                              CHECK (pressure_pa > 0 AND pressure_pa < 'Infinity'),
    pressure_origin           text NOT NULL DEFAULT 'STATED' CONSTRAINT ck_series_points_pressure_origin
                              CHECK (pressure_origin IN ('STATED', 'ASSIGNED', 'REDUCED_BY_SOURCE')),
    diffusivity_m2_s          double precision NOT NULL CONSTRAINT ck_series_points_diffusivity
                              CHECK (diffusivity_m2_s > 0 AND diffusivity_m2_s < 'Infinity'),
    diffusivity_u_m2_s        double precision CONSTRAINT ck_series_points_diffusivity_u
                              CHECK (diffusivity_u_m2_s > 0 AND diffusivity_u_m2_s < 'Infinity'),
    uncertainty_origin        text CONSTRAINT ck_series_points_uncertainty_origin
                              CHECK (uncertainty_origin IN ('STATED', 'ASSIGNED')),
    temperature_u_k           double precision CONSTRAINT ck_series_points_temperature_u
                              CHECK (temperature_u_k > 0 AND temperature_u_k < 'Infinity'),
    pressure_u_pa             double precision CONSTRAINT ck_series_points_pressure_u
                              CHECK (pressure_u_pa > 0 AND pressure_u_pa < 'Infinity'),
    mole_fraction             double precision CONSTRAINT ck_series_points_mole_fraction
                              CHECK (mole_fraction BETWEEN 0 AND 1),
    replicates                int CONSTRAINT ck_series_points_replicates CHECK (replicates >= 1),
    CONSTRAINT pk_series_points PRIMARY KEY (series_id, index)
  );
  CREATE TABLE series_events (
    id        bigint GENERATED ALWAYS AS IDENTITY CONSTRAINT pk_series_events PRIMARY KEY,
    series_id uuid NOT NULL CONSTRAINT fk_series_events_series REFERENCES series,
    action    text NOT NULL,
    status    text NOT NULL,
    remark    text,
    person_id uuid NOT NULL CONSTRAINT fk_series_events_person REFERENCES people,
    at        timestamptz NOT NULL DEFAULT now()
  );
  CREATE INDEX ix_series_events_series ON series_events (series_id);`;

const FITS = `
  CREATE TABLE fits (
    id              uuid NOT NULL DEFAULT gen_random_uuid() CONSTRAINT pk_fits PRIMARY KEY,
    pair_id         uuid NOT NULL CONSTRAINT fk_fits_pair REFERENCES gas_pairs,
    number          int NOT NULL CONSTRAINT ck_fits_number CHECK (number >= 1),
    recipe          jsonb NOT NULL,
    excluded_points jsonb NOT NULL,
    left_out_series jsonb NOT NULL,
    result          jsonb NOT NULL,
    engine_version  text NOT NULL,
    created_by_id   uuid NOT NULL CONSTRAINT fk_fits_created_by REFERENCES people,
    created_at      timestamptz NOT NULL DEFAULT now(),
    CONSTRAINT uq_fits_pair_number UNIQUE (pair_id, number)
  );
  CREATE TABLE fit_series (
    fit_id    uuid NOT NULL CONSTRAINT fk_fit_series_fit REFERENCES fits,
    series_id uuid NOT NULL CONSTRAINT fk_fit_series_series REFERENCES series,
    CONSTRAINT pk_fit_series PRIMARY KEY (fit_id, series_id)
  );
  CREATE INDEX ix_fit_series_series ON fit_series (series_id);`;

const SHEETS = `
  CREATE TABLE data_sheets (
    id         uuid NOT NULL DEFAULT gen_random_uuid() CONSTRAINT pk_data_sheets PRIMARY KEY,
    number     int GENERATED ALWAYS AS IDENTITY CONSTRAINT uq_data_sheets_number UNIQUE,
    code       text GENERATED ALWAYS AS ('DS-' || CASE WHEN number < 10000 THEN lpad(number::text, 4, '0')
               ELSE number::text END) STORED CONSTRAINT uq_data_sheets_code UNIQUE,
    pair_id    uuid NOT NULL CONSTRAINT fk_data_sheets_pair REFERENCES gas_pairs,
    created_at timestamptz NOT NULL DEFAULT now(),
    CONSTRAINT uq_data_sheets_pair UNIQUE (pair_id)
  );
  CREATE TABLE data_sheet_versions (
    id                uuid NOT NULL DEFAULT gen_random_uuid() CONSTRAINT pk_data_sheet_versions PRIMARY KEY,
    data_sheet_id     uuid NOT NULL CONSTRAINT fk_data_sheet_versions_sheet REFERENCES data_sheets,
    edition           int NOT NULL CONSTRAINT ck_data_sheet_versions_edition CHECK (edition >= 1),
    revision          int NOT NULL CONSTRAINT ck_data_sheet_versions_revision CHECK (revision >= 0),
    status            text NOT NULL DEFAULT 'DRAFT' CONSTRAINT ck_data_sheet_versions_status
                      CHECK (status IN ('DRAFT', 'IN_REVIEW', 'RETURNED', 'APPROVED', 'RELEASED', 'SUPERSEDED', 'WITHDRAWN')),
    fit_id            uuid NOT NULL CONSTRAINT fk_data_sheet_versions_fit REFERENCES fits,
    summary           text NOT NULL,
    change_note       text,
    remarks           jsonb NOT NULL DEFAULT '{}',
    validity          jsonb,
    prepared_by_id    uuid NOT NULL CONSTRAINT fk_data_sheet_versions_prepared_by REFERENCES people,
    lock_version      int NOT NULL DEFAULT 1,
    superseded_by_id  uuid CONSTRAINT fk_data_sheet_versions_superseded_by REFERENCES data_sheet_versions,
    withdrawn_at      timestamptz,
    withdrawn_by_id   uuid CONSTRAINT fk_data_sheet_versions_withdrawn_by REFERENCES people,
    withdrawal_reason text,
    doi_registered_at timestamptz,
    created_at        timestamptz NOT NULL DEFAULT now(),
    updated_at        timestamptz NOT NULL DEFAULT now(),
    CONSTRAINT ck_data_sheet_versions_withdrawal CHECK ((status = 'WITHDRAWN') = (withdrawal_reason IS NOT NULL))
  );
  CREATE INDEX ix_data_sheet_versions_sheet ON data_sheet_versions (data_sheet_id);
  CREATE INDEX ix_data_sheet_versions_fit ON data_sheet_versions (fit_id);
  CREATE UNIQUE INDEX uq_data_sheet_versions_number ON data_sheet_versions (data_sheet_id, edition, revision)
    WHERE status IN ('RELEASED', 'SUPERSEDED', 'WITHDRAWN');
  CREATE UNIQUE INDEX uq_data_sheet_versions_current ON data_sheet_versions (data_sheet_id) WHERE status = 'RELEASED';
  CREATE TABLE version_events (
    id         bigint GENERATED ALWAYS AS IDENTITY CONSTRAINT pk_version_events PRIMARY KEY,
    version_id uuid NOT NULL CONSTRAINT fk_version_events_version REFERENCES data_sheet_versions,
    action     text NOT NULL,
    status     text NOT NULL,
    remark     text,
    person_id  uuid NOT NULL CONSTRAINT fk_version_events_person REFERENCES people,
    at         timestamptz NOT NULL DEFAULT now()
  );
  CREATE INDEX ix_version_events_version ON version_events (version_id);
  CREATE TABLE reviews (
    id          uuid NOT NULL DEFAULT gen_random_uuid() CONSTRAINT pk_reviews PRIMARY KEY,
    version_id  uuid NOT NULL CONSTRAINT fk_reviews_version REFERENCES data_sheet_versions,
    reviewer_id uuid NOT NULL CONSTRAINT fk_reviews_reviewer REFERENCES people,
    verdict     text NOT NULL CONSTRAINT ck_reviews_verdict CHECK (verdict IN ('APPROVE', 'RETURN')),
    remark      text NOT NULL,
    checklist   jsonb NOT NULL DEFAULT '[]',
    created_at  timestamptz NOT NULL DEFAULT now()
  );
  CREATE INDEX ix_reviews_version ON reviews (version_id);
  CREATE TABLE releases (
    sequence       bigint NOT NULL CONSTRAINT pk_releases PRIMARY KEY,
    version_id     uuid NOT NULL CONSTRAINT fk_releases_version REFERENCES data_sheet_versions,
    content_hash   char(64) NOT NULL CONSTRAINT ck_releases_content_hash CHECK (content_hash ~ '^[0-9a-f]{64}$'),
    previous_hash  char(64),
    snapshot       text NOT NULL,
    doi            text NOT NULL,
    released_by_id uuid NOT NULL CONSTRAINT fk_releases_released_by REFERENCES people,
    released_at    timestamptz NOT NULL,
    CONSTRAINT uq_releases_version UNIQUE (version_id),
    CONSTRAINT uq_releases_content_hash UNIQUE (content_hash),
    CONSTRAINT uq_releases_doi UNIQUE (doi),
    CONSTRAINT ck_releases_sequence CHECK ((sequence = 1) = (previous_hash IS NULL)),
    CONSTRAINT ck_releases_snapshot CHECK (encode(sha256(convert_to(snapshot, 'UTF8')), 'hex') = content_hash)
  );
  -- What has been seeded whole, so that a start that was cut short goes on where it stopped.
  CREATE TABLE seeds (
    name        text NOT NULL CONSTRAINT pk_seeds PRIMARY KEY,
    finished_at timestamptz NOT NULL DEFAULT now()
  );
  CREATE TABLE subscriptions (
    person_id     uuid NOT NULL CONSTRAINT fk_subscriptions_person REFERENCES people ON DELETE CASCADE,
    data_sheet_id uuid NOT NULL CONSTRAINT fk_subscriptions_sheet REFERENCES data_sheets ON DELETE CASCADE,
    created_at    timestamptz NOT NULL DEFAULT now(),
    CONSTRAINT pk_subscriptions PRIMARY KEY (person_id, data_sheet_id)
  );`;

/** What the database itself refuses, whoever asks. */
const GUARDS = `
  CREATE FUNCTION refuse_change() RETURNS trigger LANGUAGE plpgsql AS $$
  BEGIN
    RAISE EXCEPTION '% rows are immutable', TG_TABLE_NAME USING ERRCODE = 'restrict_violation';
  END $$;
  CREATE TRIGGER releases_immutable BEFORE UPDATE OR DELETE ON releases FOR EACH ROW EXECUTE FUNCTION refuse_change();
  CREATE TRIGGER releases_not_truncated BEFORE TRUNCATE ON releases EXECUTE FUNCTION refuse_change();
  CREATE TRIGGER fits_immutable BEFORE UPDATE OR DELETE ON fits FOR EACH ROW EXECUTE FUNCTION refuse_change();
  CREATE TRIGGER fit_series_immutable BEFORE UPDATE OR DELETE ON fit_series FOR EACH ROW EXECUTE FUNCTION refuse_change();
  CREATE TRIGGER reviews_immutable BEFORE UPDATE OR DELETE ON reviews FOR EACH ROW EXECUTE FUNCTION refuse_change();
  CREATE TRIGGER series_events_immutable BEFORE UPDATE OR DELETE ON series_events FOR EACH ROW EXECUTE FUNCTION refuse_change();
  CREATE TRIGGER version_events_immutable BEFORE UPDATE OR DELETE ON version_events FOR EACH ROW EXECUTE FUNCTION refuse_change();

  CREATE TRIGGER fits_not_truncated BEFORE TRUNCATE ON fits EXECUTE FUNCTION refuse_change();
  CREATE TRIGGER fit_series_not_truncated BEFORE TRUNCATE ON fit_series EXECUTE FUNCTION refuse_change();
  CREATE TRIGGER reviews_not_truncated BEFORE TRUNCATE ON reviews EXECUTE FUNCTION refuse_change();
  CREATE TRIGGER series_events_not_truncated BEFORE TRUNCATE ON series_events EXECUTE FUNCTION refuse_change();
  CREATE TRIGGER version_events_not_truncated BEFORE TRUNCATE ON version_events EXECUTE FUNCTION refuse_change();
  CREATE TRIGGER series_points_not_truncated BEFORE TRUNCATE ON series_points EXECUTE FUNCTION refuse_change();

  -- Releases form one chain without gaps: each names the hash of the one before it.
  CREATE FUNCTION check_release_chain() RETURNS trigger LANGUAGE plpgsql AS $$
  BEGIN
    IF NEW.sequence > 1 AND NOT EXISTS (
      SELECT FROM releases WHERE sequence = NEW.sequence - 1 AND content_hash = NEW.previous_hash
    ) THEN
      RAISE EXCEPTION 'release % does not continue the chain', NEW.sequence USING ERRCODE = 'integrity_constraint_violation';
    END IF;
    RETURN NEW;
  END $$;
  CREATE TRIGGER releases_chain BEFORE INSERT ON releases FOR EACH ROW EXECUTE FUNCTION check_release_chain();

  -- A version leaves the released states never; what it says is frozen; its number continues the sheet's last.
  CREATE FUNCTION check_version_change() RETURNS trigger LANGUAGE plpgsql AS $$
  DECLARE
    released CONSTANT text[] := ARRAY['RELEASED', 'SUPERSEDED', 'WITHDRAWN'];
    last record;
  BEGIN
    IF TG_OP = 'DELETE' THEN
      IF OLD.status = ANY (released) THEN
        RAISE EXCEPTION 'a released version cannot be deleted' USING ERRCODE = 'restrict_violation';
      END IF;
      RETURN OLD;
    END IF;
    IF TG_OP = 'UPDATE' AND OLD.status = ANY (released) THEN
      IF NOT (NEW.status = ANY (released)) OR (OLD.status <> 'RELEASED' AND NEW.status = 'RELEASED')
        OR (OLD.status = 'WITHDRAWN' AND NEW.status <> 'WITHDRAWN') THEN
        RAISE EXCEPTION 'a release cannot be undone' USING ERRCODE = 'restrict_violation';
      END IF;
      IF (NEW.data_sheet_id, NEW.edition, NEW.revision, NEW.fit_id, NEW.summary, NEW.change_note, NEW.remarks, NEW.validity,
          NEW.prepared_by_id) IS DISTINCT FROM (OLD.data_sheet_id, OLD.edition, OLD.revision, OLD.fit_id, OLD.summary,
          OLD.change_note, OLD.remarks, OLD.validity, OLD.prepared_by_id) THEN
        RAISE EXCEPTION 'a released version is immutable' USING ERRCODE = 'restrict_violation';
      END IF;
      RETURN NEW;
    END IF;
    IF NEW.status = ANY (released) THEN
      SELECT edition, revision INTO last FROM data_sheet_versions
        WHERE data_sheet_id = NEW.data_sheet_id AND status = ANY (released) AND id <> NEW.id
        ORDER BY edition DESC, revision DESC LIMIT 1;
      IF (last IS NULL AND (NEW.edition, NEW.revision) <> (1, 0))
        OR (last IS NOT NULL AND (NEW.edition, NEW.revision) <> (last.edition, last.revision + 1)
            AND (NEW.edition, NEW.revision) <> (last.edition + 1, 0)) THEN
        RAISE EXCEPTION 'version %.% leaves a gap', NEW.edition, NEW.revision USING ERRCODE = 'integrity_constraint_violation';
      END IF;
    END IF;
    RETURN NEW;
  END $$;
  CREATE TRIGGER data_sheet_versions_change BEFORE INSERT OR UPDATE OR DELETE ON data_sheet_versions
    FOR EACH ROW EXECUTE FUNCTION check_version_change();
  CREATE TRIGGER data_sheet_versions_not_truncated BEFORE TRUNCATE ON data_sheet_versions EXECUTE FUNCTION refuse_change();

  -- Points change only while their series is a draft or returned. By statement, so that COPY stays cheap.
  CREATE FUNCTION check_points_open() RETURNS trigger LANGUAGE plpgsql AS $$
  BEGIN
    IF EXISTS (
      SELECT FROM series JOIN (SELECT DISTINCT series_id FROM changed) c ON c.series_id = series.id
      WHERE series.status NOT IN ('DRAFT', 'RETURNED')
    ) THEN
      RAISE EXCEPTION 'the points of a submitted, accepted or retired series are immutable' USING ERRCODE = 'restrict_violation';
    END IF;
    RETURN NULL;
  END $$;
  CREATE TRIGGER series_points_inserted AFTER INSERT ON series_points REFERENCING NEW TABLE AS changed
    FOR EACH STATEMENT EXECUTE FUNCTION check_points_open();
  CREATE TRIGGER series_points_updated AFTER UPDATE ON series_points REFERENCING NEW TABLE AS changed
    FOR EACH STATEMENT EXECUTE FUNCTION check_points_open();
  CREATE TRIGGER series_points_deleted AFTER DELETE ON series_points REFERENCING OLD TABLE AS changed
    FOR EACH STATEMENT EXECUTE FUNCTION check_points_open();`;

export class CreateSchema1764576000000 implements MigrationInterface {
  async up(db: QueryRunner): Promise<void> {
    for (const part of [PEOPLE, SUBSTANCES, SERIES, FITS, SHEETS, GUARDS]) await db.query(part);
  }

  async down(db: QueryRunner): Promise<void> {
    await db.query(`
      DROP TABLE seeds, subscriptions, releases, reviews, version_events, data_sheet_versions, data_sheets, fit_series, fits,
        series_events, series_points, series, files, gas_pairs, substances, api_keys, refresh_tokens, sessions,
        account_tokens, people;
      DROP FUNCTION cas_number_is_valid, refuse_change, check_release_chain, check_version_change, check_points_open;`);
  }
}
