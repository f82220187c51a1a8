import type { Migration } from './migration.ts';

/** Each event holds the hash of the one before it; the first holds 64 zeros. The chain has neither fork nor gap. */
export const audit: Migration = {
  name: '0007-audit',
  up: `
    CREATE TABLE audit_events (
      sequence bigint PRIMARY KEY CHECK (sequence >= 1),
      at timestamptz NOT NULL,
      actor_id uuid REFERENCES people,
      action text NOT NULL,
      subject_kind text NOT NULL,
      subject_id text,
      programme_id uuid REFERENCES programmes,
      detail jsonb NOT NULL,
      previous_hash text NOT NULL UNIQUE CHECK (previous_hash ~ '^[0-9a-f]{64}$'),
      hash text NOT NULL UNIQUE CHECK (hash ~ '^[0-9a-f]{64}$')
    );
    CREATE INDEX audit_events_actor ON audit_events (actor_id, sequence DESC);
    CREATE INDEX audit_events_programme ON audit_events (programme_id, sequence DESC);
    CREATE INDEX audit_events_action ON audit_events (action, sequence DESC);

    CREATE FUNCTION audit_event_continues_chain() RETURNS trigger LANGUAGE plpgsql SET search_path = public AS $$
    DECLARE
      last audit_events%ROWTYPE;
    BEGIN
      SELECT * INTO last FROM audit_events ORDER BY sequence DESC LIMIT 1;
      IF NEW.sequence <> coalesce(last.sequence, 0) + 1
        OR NEW.previous_hash <> coalesce(last.hash, repeat('0', 64)) THEN
        RAISE EXCEPTION 'audit event % does not continue the chain, which ends at %',
          NEW.sequence, coalesce(last.sequence, 0) USING ERRCODE = 'integrity_constraint_violation';
      END IF;
      RETURN NEW;
    END
    $$;
    CREATE TRIGGER audit_event_continues_chain BEFORE INSERT ON audit_events
      FOR EACH ROW EXECUTE FUNCTION audit_event_continues_chain();
    GRANT SELECT, INSERT ON audit_events TO tipward_app;
  `,
  down: `
    DROP TABLE audit_events;
    DROP FUNCTION audit_event_continues_chain();
  `,
};
