import { randomBytes } from 'node:crypto';
import type { TestProject } from 'vitest/node';
import { connect } from '../src/db/connect.ts';
import { createMigrator } from '../src/db/migrator.ts';
import { asAdmin, urlAs } from './admin-connection.ts';

declare module 'vitest' {
  interface ProvidedContext {
    templateDatabase: string;
  }
}

const DUPLICATE_ROLE = '42710';
const CREATED_AT_ONCE = '23505';

async function createRole(name: string): Promise<void> {
  await asAdmin(async (client) => {
    try {
      await client.query(`CREATE ROLE ${name} LOGIN`);
    } catch (error) {
      const code = (error as { code?: string }).code;
      if (code !== DUPLICATE_ROLE && code !== CREATED_AT_ONCE) throw error;
    }
  });
}

/** Makes one migrated database that each test file copies. */
export default async function setUp(project: TestProject): Promise<() => Promise<void>> {
  await createRole('tipward_owner');
  await createRole('tipward_app');
  const template = `tipward_template_${randomBytes(6).toString('hex')}`;
  await asAdmin((client) => client.query(`CREATE DATABASE ${template} OWNER tipward_owner`));
  const db = connect(urlAs('tipward_owner', template), 2);
  await createMigrator(db, () => undefined).up();
  await db.close();
  project.provide('templateDatabase', template);
  return async () => {
    await asAdmin((client) => client.query(`DROP DATABASE IF EXISTS ${template} WITH (FORCE)`));
  };
}
