import type { QueryInterface, Sequelize } from 'sequelize';
import { SequelizeStorage, Umzug } from 'umzug';
import { migrations } from './migrations/index.ts';

/** The migrations in order, run by the owner of the database. Each one runs in a transaction of its own. */
export function createMigrator(db: Sequelize, log: (message: string) => void): Umzug<QueryInterface> {
  const queryInterface = db.getQueryInterface();
  return new Umzug<QueryInterface>({
    migrations: migrations.map(({ name, up, down }) => ({
      name,
      up: async () => {
        await db.transaction(async (transaction) => {
          await db.query(up, { transaction });
        });
      },
      down: async () => {
        await db.transaction(async (transaction) => {
          await db.query(down, { transaction });
        });
      },
    })),
    context: queryInterface,
    storage: new SequelizeStorage({ sequelize: db, tableName: 'schema_migrations' }),
    logger: {
      info: (event) => {
        if (event['event'] === 'migrated' || event['event'] === 'reverted')
          log(`${event['event']} ${String(event['name'])}`);
      },
      warn: (event) => {
        log(JSON.stringify(event));
      },
      error: (event) => {
        log(JSON.stringify(event));
      },
      debug: () => undefined,
    },
  });
}
