import { existsSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { serverUser } from './server-user.mjs';

/**
 * Where the data go: `wanted`, or `postgres` in the folder `outside` when PostgreSQL's user cannot reach the former (a
 * checkout below root's home). Once there, they stay there. The folder above `wanted` must exist.
 */
export function dataPlace(wanted, outside) {
  const other = join(outside, 'postgres');
  if (existsSync(other)) return other;
  return serverUser(wanted).reaches(dirname(wanted)) ? wanted : other;
}
