import { randomBytes } from 'node:crypto';
import { inject } from 'vitest';
import { asAdmin, urlAs } from './admin-connection.ts';

export interface TestDatabase {
  readonly name: string;
  readonly appUrl: string;
  readonly ownerUrl: string;
  /** Removes it, unless TIPWARD_KEEP_TEST_DATABASES asks to keep it for a look. */
  readonly drop: () => Promise<void>;
}

/** A database of its own for one test file: a copy of the migrated template, or an empty one. */
export async function createTestDatabase(kind: 'migrated' | 'empty' = 'migrated'): Promise<TestDatabase> {
  const name = `tipward_test_${randomBytes(6).toString('hex')}`;
  const from = kind === 'migrated' ? ` TEMPLATE ${inject('templateDatabase')}` : '';
  await asAdmin(async (client) => {
    await client.query(`CREATE DATABASE ${name} OWNER tipward_owner${from}`);
    // Rights on a database are not copied with it; on an empty one the first migration grants them.
    if (kind === 'migrated') await client.query(`GRANT CONNECT, CREATE ON DATABASE ${name} TO tipward_app`);
  });
  return {
    name,
    appUrl: urlAs('tipward_app', name),
    ownerUrl: urlAs('tipward_owner', name),
    drop: async () => {
      if (process.env['TIPWARD_KEEP_TEST_DATABASES'] !== undefined) return;
      await asAdmin((client) => client.query(`DROP DATABASE IF EXISTS ${name} WITH (FORCE)`));
    },
  };
}
