import type { Migration } from './migration.ts';

/** The state of a review is derived: a withdrawal and a decision are records of their own. */
export const reviews: Migration = {
  name: '0005-reviews',
  up: `
    CREATE TABLE reviews (
      id uuid PRIMARY KEY,
      ordinal bigint GENERATED ALWAYS AS IDENTITY UNIQUE,
      version_id uuid NOT NULL REFERENCES versions,
      message text NOT NULL,
      asked_by uuid NOT NULL REFERENCES people,
      asked_at timestamptz NOT NULL
    );
    CREATE INDEX reviews_version ON reviews (version_id, ordinal DESC);
    CREATE TABLE review_withdrawals (
      review_id uuid PRIMARY KEY REFERENCES reviews,
      withdrawn_by uuid NOT NULL REFERENCES people,
      withdrawn_at timestamptz NOT NULL
    );
    CREATE TABLE decisions (
      id uuid PRIMARY KEY,
      review_id uuid NOT NULL UNIQUE REFERENCES reviews,
      version_id uuid NOT NULL REFERENCES versions,
      outcome text NOT NULL CHECK (outcome IN ('approved', 'changes-requested')),
      note text NOT NULL,
      content_hash text NOT NULL,
      specification_hash text NOT NULL,
      decided_by uuid NOT NULL REFERENCES people,
      decided_at timestamptz NOT NULL
    );
    CREATE INDEX decisions_version ON decisions (version_id);
    CREATE TABLE comments (
      id uuid PRIMARY KEY,
      review_id uuid NOT NULL REFERENCES reviews,
      author_id uuid NOT NULL REFERENCES people,
      text text NOT NULL,
      station_radius_m double precision,
      reply_to uuid REFERENCES comments,
      created_at timestamptz NOT NULL,
      resolved_at timestamptz,
      resolved_by uuid REFERENCES people,
      CHECK ((resolved_at IS NULL) = (resolved_by IS NULL))
    );
    CREATE INDEX comments_review ON comments (review_id, created_at);
    GRANT SELECT, INSERT ON reviews, review_withdrawals, decisions, comments TO tipward_app;
    GRANT UPDATE (resolved_at, resolved_by) ON comments TO tipward_app;
  `,
  down: `
    DROP TABLE comments, decisions, review_withdrawals, reviews;
  `,
};
