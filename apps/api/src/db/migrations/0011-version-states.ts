import type { Migration } from './migration.ts';

/** The state of a version, read from what was recorded about it; one place that says what each state means. */
export const versionStates: Migration = {
  name: '0011-version-states',
  up: `
    CREATE VIEW version_states AS
    SELECT
      v.id AS version_id,
      d.programme_id,
      v.design_id,
      v.author_id,
      review.id AS review_id,
      decision.outcome,
      release.id AS release_id,
      release.letter,
      CASE
        WHEN release.id IS NOT NULL AND release.superseded THEN 'superseded'
        WHEN release.id IS NOT NULL THEN 'released'
        WHEN review.id IS NULL THEN 'saved'
        WHEN withdrawal.review_id IS NOT NULL THEN 'withdrawn'
        WHEN decision.outcome IS NULL THEN 'in-review'
        ELSE decision.outcome
      END AS state
    FROM versions v
    JOIN designs d ON d.id = v.design_id
    LEFT JOIN LATERAL (
      SELECT r.id FROM reviews r WHERE r.version_id = v.id ORDER BY r.ordinal DESC LIMIT 1
    ) review ON true
    LEFT JOIN review_withdrawals withdrawal ON withdrawal.review_id = review.id
    LEFT JOIN decisions decision ON decision.review_id = review.id
    LEFT JOIN LATERAL (
      SELECT x.id, x.letter, EXISTS (
        SELECT FROM releases later
        WHERE later.programme_id = x.programme_id AND later.sequence > x.sequence
      ) AS superseded
      FROM releases x WHERE x.version_id = v.id
    ) release ON true;
    GRANT SELECT ON version_states TO tipward_app;
  `,
  down: `
    DROP VIEW version_states;
  `,
};
