import type { Migration } from './migration.ts';

/** Mail waits here in the transaction of what caused it; a job sends it afterwards. */
export const mail: Migration = {
  name: '0008-mail',
  up: `
    CREATE TABLE outbox (
      id uuid PRIMARY KEY,
      kind text NOT NULL,
      to_address text NOT NULL,
      subject text NOT NULL,
      text text NOT NULL,
      created_at timestamptz NOT NULL,
      queued_at timestamptz,
      sent_at timestamptz,
      attempts integer NOT NULL DEFAULT 0,
      last_error text
    );
    CREATE INDEX outbox_unsent ON outbox (created_at) WHERE sent_at IS NULL;
    GRANT SELECT, INSERT, UPDATE ON outbox TO tipward_app;
  `,
  down: `
    DROP TABLE outbox;
  `,
};
