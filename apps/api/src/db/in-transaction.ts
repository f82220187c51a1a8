import { DatabaseError, type Transaction } from 'sequelize';
import type { Context } from '../context.ts';

/** Deadlock and serialisation failure: PostgreSQL undid everything, so the work may simply run again. */
const RETRY_CODES = new Set(['40P01', '40001']);
const ATTEMPTS = 3;

export function databaseErrorCode(error: unknown): string | null {
  if (!(error instanceof DatabaseError)) return null;
  const code: unknown = (error.original as { code?: unknown }).code;
  return typeof code === 'string' ? code : null;
}

/** Runs the work in one transaction: all of it is kept, or nothing. Runs it again after a deadlock. */
export async function inTransaction<T>(
  context: Context,
  work: (transaction: Transaction) => Promise<T>,
): Promise<T> {
  for (let attempt = 1; ; attempt += 1) {
    try {
      return await context.db.transaction(work);
    } catch (error) {
      const code = databaseErrorCode(error);
      if (code === null || !RETRY_CODES.has(code) || attempt === ATTEMPTS) throw error;
    }
  }
}
