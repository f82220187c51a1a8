import { Sequelize } from 'sequelize';
import { ConfigError } from '../config/config-error.ts';
import { createMigrator } from '../db/migrator.ts';
import { runProgram } from './run-program.ts';

/** Number of the lock that keeps two migrations of one database apart. */
const MIGRATION_LOCK = 4_817_002;

/** Brings the schema of OWNER_DATABASE_URL up to date: `migrate`. One step back: `migrate down`. */
runProgram(async () => {
  const url = process.env['OWNER_DATABASE_URL'];
  if (url === undefined)
    throw new ConfigError(['OWNER_DATABASE_URL is missing; allowed: a postgres:// address of the owner']);
  const direction = process.argv[2] ?? 'up';
  if (direction !== 'up' && direction !== 'down')
    throw new ConfigError([`${direction} is no direction; allowed: up, down`]);
  const db = new Sequelize(url, { dialect: 'postgres', logging: false, pool: { max: 4 } });
  try {
    await db.transaction(async (transaction) => {
      await db.query(`SELECT pg_advisory_xact_lock(${MIGRATION_LOCK})`, { transaction });
      const migrator = createMigrator(db, (message) => process.stdout.write(`${message}\n`));
      const done = direction === 'up' ? await migrator.up() : await migrator.down();
      process.stdout.write(done.length === 0 ? 'nothing to migrate\n' : `${done.length} migrated\n`);
    });
  } finally {
    await db.close();
  }
  return 0;
});
