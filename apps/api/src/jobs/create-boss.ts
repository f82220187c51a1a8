import PgBoss from 'pg-boss';
import type { Context } from '../context.ts';
import type { JobDefinition } from './definitions/job-definition.ts';

/** The job queue; it keeps its tables in a schema of its own, which the application owns. */
export function createBoss(context: Context): PgBoss {
  const boss = new PgBoss({
    connectionString: context.config.databaseUrl,
    application_name: 'tipward-jobs',
    schema: 'pgboss',
    max: 4,
    archiveCompletedAfterSeconds: 3600,
    deleteAfterDays: 14,
  });
  boss.on('error', (error) => {
    context.log.error({ err: error }, 'the job queue reports an error');
  });
  return boss;
}

export async function enqueue(
  boss: PgBoss,
  { id, retryLimit, retryDelay, expireInSeconds }: JobDefinition,
  payload: object,
): Promise<void> {
  await boss.send(id, payload, { retryLimit, retryDelay, retryBackoff: true, expireInSeconds });
}
