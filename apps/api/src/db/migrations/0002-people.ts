import type { Migration } from './migration.ts';

export const people: Migration = {
  name: '0002-people',
  up: `
    CREATE TABLE people (
      id uuid PRIMARY KEY,
      email text NOT NULL UNIQUE CHECK (email = lower(email)),
      name text NOT NULL,
      is_administrator boolean NOT NULL DEFAULT false,
      created_at timestamptz NOT NULL,
      disabled_at timestamptz,
      last_seen_at timestamptz
    );
    CREATE TABLE credentials (
      person_id uuid PRIMARY KEY REFERENCES people,
      password_hash text NOT NULL,
      changed_at timestamptz NOT NULL
    );
    CREATE TABLE session_families (
      id uuid PRIMARY KEY,
      person_id uuid NOT NULL REFERENCES people,
      created_at timestamptz NOT NULL,
      ended_at timestamptz,
      ended_reason text,
      CHECK ((ended_at IS NULL) = (ended_reason IS NULL))
    );
    CREATE INDEX session_families_person ON session_families (person_id) WHERE ended_at IS NULL;
    CREATE TABLE refresh_sessions (
      id uuid PRIMARY KEY,
      family_id uuid NOT NULL REFERENCES session_families ON DELETE CASCADE,
      token_hash text NOT NULL UNIQUE,
      created_at timestamptz NOT NULL,
      expires_at timestamptz NOT NULL,
      used_at timestamptz,
      successor_id uuid UNIQUE REFERENCES refresh_sessions DEFERRABLE INITIALLY DEFERRED,
      CHECK ((used_at IS NULL) = (successor_id IS NULL))
    );
    CREATE INDEX refresh_sessions_family ON refresh_sessions (family_id);
    CREATE TABLE one_time_links (
      id uuid PRIMARY KEY,
      person_id uuid NOT NULL REFERENCES people,
      purpose text NOT NULL CHECK (purpose IN ('invitation', 'password-reset')),
      token_hash text NOT NULL UNIQUE,
      created_at timestamptz NOT NULL,
      expires_at timestamptz NOT NULL,
      used_at timestamptz
    );
    CREATE INDEX one_time_links_person ON one_time_links (person_id, purpose) WHERE used_at IS NULL;
    CREATE TABLE idempotency_keys (
      person_id uuid NOT NULL REFERENCES people,
      operation text NOT NULL,
      key text NOT NULL,
      request_hash text NOT NULL,
      created_at timestamptz NOT NULL,
      status integer,
      body jsonb,
      etag text,
      PRIMARY KEY (person_id, operation, key)
    );
    CREATE INDEX idempotency_keys_age ON idempotency_keys (created_at);
    GRANT SELECT, INSERT, UPDATE ON people, credentials, one_time_links TO tipward_app;
    GRANT SELECT, INSERT, UPDATE, DELETE ON session_families, refresh_sessions, idempotency_keys TO tipward_app;
  `,
  down: `
    DROP TABLE idempotency_keys, one_time_links, refresh_sessions, session_families, credentials, people;
  `,
};
