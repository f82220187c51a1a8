import type { getHealth, ResponseOf } from '@tipward/contract';
import { QueryTypes } from 'sequelize';
import type { Context } from '../../context.ts';
import { migrations } from '../../db/migrations/index.ts';
import { APP_VERSION } from '../../version.ts';

/** Asks the database for its migrations: well only when it answers and has exactly those of this program. */
export async function checkHealth(context: Context): Promise<ResponseOf<typeof getHealth>> {
  try {
    const rows = await context.db.query<{ name: string }>(
      'SELECT name FROM schema_migrations ORDER BY name',
      {
        type: QueryTypes.SELECT,
      },
    );
    const applied = rows.map(({ name }) => name).join();
    const well = applied === migrations.map(({ name }) => name).join();
    return { status: well ? 'ok' : 'failing', version: APP_VERSION, database: 'ok' };
  } catch (error) {
    context.log.error({ err: error }, 'the database does not answer');
    return { status: 'failing', version: APP_VERSION, database: 'failing' };
  }
}
