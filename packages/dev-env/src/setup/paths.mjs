import { createHash } from 'node:crypto';
import { fileURLToPath } from 'node:url';
import { dirname, join, resolve } from 'node:path';

/** The repository's root, and the folder git ignores in which everything of this machine lives. */
export const ROOT = resolve(dirname(fileURLToPath(import.meta.url)), '../../../..');
export const LOCAL = join(ROOT, '.local');

/** Short name of this checkout, for places outside it (socket folders, data that the postgres user must reach). */
export const CHECKOUT_ID = createHash('sha256').update(ROOT).digest('hex').slice(0, 10);
