import type { Sequelize, Transaction } from 'sequelize';

/**
 * Makes transactions about one subject wait for each other until they end. Permanent rows cannot be locked by a role that
 * may not change them, so the subject's name is.
 */
export async function queueUp(db: Sequelize, transaction: Transaction, subject: string): Promise<void> {
  await db.query('SELECT pg_advisory_xact_lock(hashtextextended(:subject, 0))', {
    replacements: { subject },
    transaction,
  });
}
