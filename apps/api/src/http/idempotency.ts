import { createHash } from 'node:crypto';
import { Op, UniqueConstraintError } from 'sequelize';
import { canonicalJson } from '@tipward/design-model';
import type { Actor } from '../policies/actor.ts';
import { IdempotencyKey } from '../models/idempotency-key.ts';
import { AppError, conflict, invalid } from './app-error.ts';

const KEPT_MS = 24 * 3600 * 1000;
/** A request that has not ended after this long was cut off with its process. */
const ABANDONED_MS = 60 * 1000;
const KEY = /^[\x21-\x7e]{1,200}$/u;

export interface StoredAnswer {
  readonly status: number;
  readonly body: unknown;
  readonly etag: string | null;
}

interface Attempt {
  readonly personId: string;
  readonly operation: string;
  readonly key: string;
}

const oldEnough = () => ({
  [Op.or]: [
    { createdAt: { [Op.lt]: new Date(Date.now() - KEPT_MS) } },
    { status: null, createdAt: { [Op.lt]: new Date(Date.now() - ABANDONED_MS) } },
  ],
});

async function begin(attempt: Attempt, requestHash: string): Promise<StoredAnswer | null> {
  await IdempotencyKey.destroy({ where: { ...attempt, ...oldEnough() } });
  try {
    await IdempotencyKey.create({ ...attempt, requestHash });
    return null;
  } catch (error) {
    if (!(error instanceof UniqueConstraintError)) throw error;
  }
  const earlier = await IdempotencyKey.findOne({ where: { ...attempt } });
  if (earlier === null) throw conflict('A request with this Idempotency-Key has just ended; send it again.');
  if (earlier.requestHash !== requestHash)
    throw new AppError('conflict', 'This Idempotency-Key was used for another request.');
  if (earlier.status === null) throw conflict('A request with this Idempotency-Key is still running.');
  return { status: earlier.status, body: earlier.body?.answer, etag: earlier.etag };
}

export function readIdempotencyKey(header: string | undefined): string | null {
  if (header === undefined) return null;
  if (KEY.test(header)) return header;
  const message = 'is not a key; allowed: 1 to 200 printable ASCII characters';
  throw invalid([{ field: 'Idempotency-Key', value: header.slice(0, 60), message }]);
}

/**
 * Does the work once for each person, operation and key; the same request again gets the same answer for 24 hours. A
 * refused request leaves no trace, so that it can be corrected and sent again.
 */
export async function once(
  actor: Actor,
  operation: string,
  key: string,
  request: unknown,
  work: () => Promise<StoredAnswer>,
): Promise<StoredAnswer> {
  const attempt = { personId: actor.personId, operation, key };
  const requestHash = createHash('sha256').update(canonicalJson(request)).digest('hex');
  const earlier = await begin(attempt, requestHash);
  if (earlier !== null) return earlier;
  try {
    const answer = await work();
    await IdempotencyKey.update(
      { status: answer.status, body: { answer: answer.body }, etag: answer.etag },
      { where: { ...attempt } },
    );
    return answer;
  } catch (error) {
    await IdempotencyKey.destroy({ where: { ...attempt } });
    throw error;
  }
}

/** Forgets answers older than a day; the worker calls it now and then. */
export async function forgetOldKeys(): Promise<number> {
  return IdempotencyKey.destroy({ where: { createdAt: { [Op.lt]: new Date(Date.now() - KEPT_MS) } } });
}
