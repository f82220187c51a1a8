import type { Migration } from './migration.ts';

/** Saved once, never changed: not by the application, not by the owner of the tables. */
export const PERMANENT_TABLES = [
  'specification_issues',
  'airfoils',
  'versions',
  'evaluations',
  'reviews',
  'review_withdrawals',
  'decisions',
  'releases',
  'audit_events',
] as const;

const protect = (table: string): string => `
    CREATE TRIGGER ${table}_are_permanent BEFORE UPDATE OR DELETE ON ${table}
      FOR EACH ROW EXECUTE FUNCTION refuse_to_change_record();
    CREATE TRIGGER ${table}_are_not_emptied BEFORE TRUNCATE ON ${table}
      FOR EACH STATEMENT EXECUTE FUNCTION refuse_to_change_record();
`;

const release = (table: string): string => `
    DROP TRIGGER ${table}_are_permanent ON ${table};
    DROP TRIGGER ${table}_are_not_emptied ON ${table};
`;

export const permanence: Migration = {
  name: '0009-permanence',
  up: `
    CREATE FUNCTION refuse_to_change_record() RETURNS trigger LANGUAGE plpgsql AS $$
    BEGIN
      RAISE EXCEPTION '% are permanent records: % is refused', TG_TABLE_NAME, TG_OP
        USING ERRCODE = 'integrity_constraint_violation',
              HINT = 'Write a new record instead; the earlier one stays.';
    END
    $$;
    ${PERMANENT_TABLES.map(protect).join('')}
  `,
  down: `
    ${PERMANENT_TABLES.map(release).join('')}
    DROP FUNCTION refuse_to_change_record();
  `,
};
