import type { Migration } from './migration.ts';

export const designs: Migration = {
  name: '0004-designs',
  up: `
    CREATE TABLE designs (
      id uuid PRIMARY KEY,
      programme_id uuid NOT NULL REFERENCES programmes,
      name text NOT NULL,
      revision integer NOT NULL DEFAULT 1,
      created_by uuid NOT NULL REFERENCES people,
      created_at timestamptz NOT NULL,
      updated_at timestamptz NOT NULL
    );
    CREATE UNIQUE INDEX designs_name ON designs (programme_id, lower(name));
    CREATE TABLE versions (
      id uuid PRIMARY KEY,
      design_id uuid NOT NULL REFERENCES designs,
      number integer NOT NULL CHECK (number >= 1),
      parent_id uuid REFERENCES versions,
      note text NOT NULL,
      content jsonb NOT NULL,
      content_hash text NOT NULL CHECK (content_hash ~ '^[0-9a-f]{64}$'),
      specification_issue integer NOT NULL,
      specification_hash text NOT NULL CHECK (specification_hash ~ '^[0-9a-f]{64}$'),
      solver_version text NOT NULL,
      change_summary jsonb NOT NULL,
      author_id uuid NOT NULL REFERENCES people,
      saved_at timestamptz NOT NULL,
      UNIQUE (design_id, number)
    );
    CREATE TABLE drafts (
      id uuid PRIMARY KEY,
      design_id uuid NOT NULL REFERENCES designs,
      author_id uuid NOT NULL REFERENCES people,
      parent_version_id uuid REFERENCES versions,
      revision integer NOT NULL DEFAULT 1,
      content jsonb NOT NULL,
      created_at timestamptz NOT NULL,
      updated_at timestamptz NOT NULL
    );
    CREATE INDEX drafts_author ON drafts (author_id, updated_at DESC);
    CREATE TABLE evaluations (
      id uuid PRIMARY KEY,
      content_hash text NOT NULL CHECK (content_hash ~ '^[0-9a-f]{64}$'),
      specification_hash text NOT NULL CHECK (specification_hash ~ '^[0-9a-f]{64}$'),
      solver_version text NOT NULL,
      evaluation jsonb NOT NULL,
      evaluated_at timestamptz NOT NULL,
      UNIQUE (content_hash, specification_hash, solver_version)
    );
    GRANT SELECT, INSERT, UPDATE ON designs TO tipward_app;
    GRANT SELECT, INSERT, UPDATE, DELETE ON drafts TO tipward_app;
    GRANT SELECT, INSERT ON versions, evaluations TO tipward_app;
  `,
  down: `
    DROP TABLE evaluations, drafts, versions, designs;
  `,
};
