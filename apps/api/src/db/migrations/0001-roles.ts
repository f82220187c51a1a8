import type { Migration } from './migration.ts';

/**
 * The application signs in as tipward_app, which owns nothing here. It may create schemas because the job queue keeps a
 * schema of its own and changes it as its version changes; it may not create anything in the schema of the records.
 */
export const roles: Migration = {
  name: '0001-roles',
  up: `
    DO $$
    BEGIN
      IF NOT EXISTS (SELECT FROM pg_roles WHERE rolname = 'tipward_app') THEN
        RAISE EXCEPTION 'role tipward_app is missing: create it before the migrations run';
      END IF;
      IF current_user = 'tipward_app' THEN
        RAISE EXCEPTION 'migrations run as the owner of the database, not as tipward_app';
      END IF;
      EXECUTE format('GRANT CONNECT, CREATE ON DATABASE %I TO tipward_app', current_database());
    END
    $$;
    REVOKE CREATE ON SCHEMA public FROM PUBLIC;
    GRANT USAGE ON SCHEMA public TO tipward_app;
    GRANT SELECT ON schema_migrations TO tipward_app;
  `,
  down: `
    REVOKE SELECT ON schema_migrations FROM tipward_app;
    REVOKE USAGE ON SCHEMA public FROM tipward_app;
    DO $$
    BEGIN
      EXECUTE format('REVOKE CONNECT, CREATE ON DATABASE %I FROM tipward_app', current_database());
    END
    $$;
  `,
};
