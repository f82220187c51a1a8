import { sql } from './sql.mjs';

/** The two roles (an owner who migrates, an application that owns nothing) and their database, made where missing. */
export async function ensureDatabase(bin, cluster, name, secrets) {
  const admin = cluster.url('postgres');
  await ensureRole(bin, admin, 'tipward_owner', secrets.ownerPassword);
  await ensureRole(bin, admin, 'tipward_app', secrets.appPassword);
  const exists =
    (await sql(bin, admin, `SELECT 1 FROM pg_database WHERE datname = '${name}';`)).trim() !== '';
  if (!exists) await sql(bin, admin, `CREATE DATABASE ${name} OWNER tipward_owner;`);
  return {
    appUrl: cluster.url(name, 'tipward_app', secrets.appPassword),
    ownerUrl: cluster.url(name, 'tipward_owner', secrets.ownerPassword),
    created: !exists,
  };
}

function ensureRole(bin, admin, role, password) {
  return sql(
    bin,
    admin,
    `DO $$ BEGIN CREATE ROLE ${role} LOGIN; EXCEPTION WHEN duplicate_object THEN NULL; END $$;
     ALTER ROLE ${role} WITH LOGIN NOSUPERUSER NOCREATEDB NOCREATEROLE PASSWORD '${password}';`,
  );
}

export async function dropDatabase(bin, cluster, name) {
  await sql(bin, cluster.url('postgres'), `DROP DATABASE IF EXISTS ${name} WITH (FORCE);`);
}
