import { createHash } from 'node:crypto';
import { fileURLToPath } from 'node:url';
import { dirname, join, resolve } from 'node:path';

/** The repository's root, and the folder git ignores in which everything of this machine lives. */
export const ROOT = resolve(dirname(fileURLToPath(import.meta.url)), '../../../..');
export const LOCAL = join(ROOT, '.local');

/** Data of a checkout that the postgres user cannot reach, such as one below root's home, go here instead. */
const CHECKOUT_ID = createHash('sha256').update(ROOT).digest('hex').slice(0, 10);
export const OUTSIDE = `/var/lib/tipward-${CHECKOUT_ID}`;

/** Not the TMPDIR of this user: socket paths must stay short and the postgres user must get there. */
export const TEMPORARY = '/tmp';

/** The programs that packages bring to the root. */
export const bin = (name) => join(ROOT, 'node_modules/.bin', name);
