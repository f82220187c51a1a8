import type { Migration } from './migration.ts';

export const programmes: Migration = {
  name: '0003-programmes',
  up: `
    CREATE TABLE programmes (
      id uuid PRIMARY KEY,
      name text NOT NULL,
      summary text NOT NULL,
      revision integer NOT NULL DEFAULT 1,
      created_by uuid NOT NULL REFERENCES people,
      created_at timestamptz NOT NULL,
      updated_at timestamptz NOT NULL
    );
    CREATE UNIQUE INDEX programmes_name ON programmes (lower(name));
    CREATE TABLE memberships (
      programme_id uuid NOT NULL REFERENCES programmes,
      person_id uuid NOT NULL REFERENCES people,
      role text NOT NULL CHECK (role IN ('aerodynamicist', 'lead', 'reader')),
      created_at timestamptz NOT NULL,
      PRIMARY KEY (programme_id, person_id)
    );
    CREATE INDEX memberships_person ON memberships (person_id);
    CREATE TABLE specification_issues (
      id uuid PRIMARY KEY,
      programme_id uuid NOT NULL REFERENCES programmes,
      issue integer NOT NULL CHECK (issue >= 1),
      note text NOT NULL,
      specification jsonb NOT NULL,
      requirements jsonb NOT NULL,
      specification_hash text NOT NULL CHECK (specification_hash ~ '^[0-9a-f]{64}$'),
      issued_by uuid NOT NULL REFERENCES people,
      issued_at timestamptz NOT NULL,
      UNIQUE (programme_id, issue)
    );
    CREATE TABLE airfoils (
      id uuid PRIMARY KEY,
      name text NOT NULL,
      thickness_pct double precision NOT NULL,
      note text NOT NULL,
      outline jsonb NOT NULL,
      polars jsonb NOT NULL,
      polar_set_hash text NOT NULL CHECK (polar_set_hash ~ '^[0-9a-f]{64}$'),
      added_by uuid NOT NULL REFERENCES people,
      added_at timestamptz NOT NULL
    );
    CREATE UNIQUE INDEX airfoils_name ON airfoils (lower(name));
    GRANT SELECT, INSERT, UPDATE ON programmes TO tipward_app;
    GRANT SELECT, INSERT, UPDATE, DELETE ON memberships TO tipward_app;
    GRANT SELECT, INSERT ON specification_issues, airfoils TO tipward_app;
  `,
  down: `
    DROP TABLE airfoils, specification_issues, memberships, programmes;
  `,
};
