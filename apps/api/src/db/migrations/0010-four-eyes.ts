import type { Migration } from './migration.ts';

/**
 * No one signs their own work: held by the database itself, whatever the application asks for. The lock on the review
 * keeps a decision and a withdrawal that come at the same moment from both being recorded.
 */
export const fourEyes: Migration = {
  name: '0010-four-eyes',
  up: `
    CREATE FUNCTION decision_is_sound() RETURNS trigger LANGUAGE plpgsql SET search_path = public AS $$
    DECLARE
      signed versions%ROWTYPE;
    BEGIN
      PERFORM pg_advisory_xact_lock(hashtextextended(NEW.review_id::text, 0));
      SELECT v.* INTO signed FROM reviews r JOIN versions v ON v.id = r.version_id WHERE r.id = NEW.review_id;
      IF signed.id IS DISTINCT FROM NEW.version_id THEN
        RAISE EXCEPTION 'the decision names a version that its review is not about'
          USING ERRCODE = 'integrity_constraint_violation';
      END IF;
      IF signed.author_id = NEW.decided_by THEN
        RAISE EXCEPTION 'four eyes: the author of a version does not decide its review'
          USING ERRCODE = 'integrity_constraint_violation';
      END IF;
      IF signed.content_hash <> NEW.content_hash OR signed.specification_hash <> NEW.specification_hash THEN
        RAISE EXCEPTION 'the decision was made on other content than the version holds'
          USING ERRCODE = 'integrity_constraint_violation';
      END IF;
      IF EXISTS (SELECT FROM review_withdrawals w WHERE w.review_id = NEW.review_id) THEN
        RAISE EXCEPTION 'the review was withdrawn: it takes no decision'
          USING ERRCODE = 'integrity_constraint_violation';
      END IF;
      RETURN NEW;
    END
    $$;
    CREATE TRIGGER decision_is_sound BEFORE INSERT ON decisions
      FOR EACH ROW EXECUTE FUNCTION decision_is_sound();

    CREATE FUNCTION withdrawal_is_sound() RETURNS trigger LANGUAGE plpgsql SET search_path = public AS $$
    BEGIN
      PERFORM pg_advisory_xact_lock(hashtextextended(NEW.review_id::text, 0));
      IF EXISTS (SELECT FROM decisions d WHERE d.review_id = NEW.review_id) THEN
        RAISE EXCEPTION 'the review is decided: it can no longer be withdrawn'
          USING ERRCODE = 'integrity_constraint_violation';
      END IF;
      RETURN NEW;
    END
    $$;
    CREATE TRIGGER withdrawal_is_sound BEFORE INSERT ON review_withdrawals
      FOR EACH ROW EXECUTE FUNCTION withdrawal_is_sound();

    CREATE FUNCTION release_is_sound() RETURNS trigger LANGUAGE plpgsql SET search_path = public AS $$
    DECLARE
      author uuid;
      home uuid;
      latest_outcome text;
    BEGIN
      SELECT v.author_id, d.programme_id INTO author, home
        FROM versions v JOIN designs d ON d.id = v.design_id WHERE v.id = NEW.version_id;
      IF home IS DISTINCT FROM NEW.programme_id THEN
        RAISE EXCEPTION 'the version belongs to another programme'
          USING ERRCODE = 'integrity_constraint_violation';
      END IF;
      IF author = NEW.released_by THEN
        RAISE EXCEPTION 'four eyes: the author of a version does not release it'
          USING ERRCODE = 'integrity_constraint_violation';
      END IF;
      SELECT d.outcome INTO latest_outcome
        FROM reviews r LEFT JOIN decisions d ON d.review_id = r.id
        WHERE r.version_id = NEW.version_id ORDER BY r.ordinal DESC LIMIT 1;
      IF latest_outcome IS DISTINCT FROM 'approved' THEN
        RAISE EXCEPTION 'the latest review of the version has not approved it'
          USING ERRCODE = 'integrity_constraint_violation';
      END IF;
      RETURN NEW;
    END
    $$;
    CREATE TRIGGER release_is_sound BEFORE INSERT ON releases
      FOR EACH ROW EXECUTE FUNCTION release_is_sound();
  `,
  down: `
    DROP TRIGGER release_is_sound ON releases;
    DROP TRIGGER withdrawal_is_sound ON review_withdrawals;
    DROP TRIGGER decision_is_sound ON decisions;
    DROP FUNCTION release_is_sound();
    DROP FUNCTION withdrawal_is_sound();
    DROP FUNCTION decision_is_sound();
  `,
};
