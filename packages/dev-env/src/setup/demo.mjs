import { mustRun } from '../processes/run.mjs';
import { ownerEnvironment } from './environment.mjs';

/** Migrates the database and makes the demo unless it is there; returns the sign-ins as the seeds print them. */
export async function makeDemo({ migrate, seed }, environment, database) {
  const env = ownerEnvironment(environment, database);
  const go = ({ command, args, cwd }) => mustRun(command, args, { cwd, env });
  if (database.created) console.log('Making the demo …');
  await go(migrate);
  return (await go(seed)).trim();
}
