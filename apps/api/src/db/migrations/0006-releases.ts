import type { Migration } from './migration.ts';

/** The release in force is the one with the highest sequence; letters follow the sequence: 1 is A, 27 is AA. */
export const releases: Migration = {
  name: '0006-releases',
  up: `
    CREATE TABLE releases (
      id uuid PRIMARY KEY,
      programme_id uuid NOT NULL REFERENCES programmes,
      version_id uuid NOT NULL UNIQUE REFERENCES versions,
      sequence integer NOT NULL CHECK (sequence >= 1),
      letter text NOT NULL CHECK (letter ~ '^[A-Z]{1,3}$'),
      effectivity text NOT NULL,
      note text NOT NULL,
      package bytea NOT NULL,
      package_sha256 text NOT NULL CHECK (package_sha256 = encode(sha256(package), 'hex')),
      package_bytes integer NOT NULL CHECK (package_bytes = octet_length(package)),
      manifest jsonb NOT NULL,
      released_by uuid NOT NULL REFERENCES people,
      released_at timestamptz NOT NULL,
      UNIQUE (programme_id, sequence),
      UNIQUE (programme_id, letter)
    );
    GRANT SELECT, INSERT ON releases TO tipward_app;
  `,
  down: `
    DROP TABLE releases;
  `,
};
