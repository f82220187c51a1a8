import { Op } from 'sequelize';
import type { Context } from '../context.ts';
import { inTransaction } from '../db/in-transaction.ts';
import { OutboxMail } from '../models/outbox-mail.ts';

const BATCH = 50;
/** By then a job has used up its retries; the message is handed out again. */
const AGAIN_AFTER_MS = 30 * 60 * 1000;

/**
 * Hands messages that wait in the outbox to the queue. Rows another worker has in hand are passed over. A message may be
 * handed out twice if the process stops in between; the handler sends it once.
 * @returns how many were handed out
 */
export async function relayOutbox(
  context: Context,
  hand: (outboxId: string) => Promise<void>,
): Promise<number> {
  return inTransaction(context, async (transaction) => {
    const again = new Date(Date.now() - AGAIN_AFTER_MS);
    const waiting = await OutboxMail.findAll({
      where: { sentAt: null, queuedAt: { [Op.or]: [{ [Op.is]: null }, { [Op.lt]: again }] } },
      attributes: ['id'],
      order: ['createdAt'],
      limit: BATCH,
      lock: transaction.LOCK.UPDATE,
      skipLocked: true,
      transaction,
    });
    for (const { id } of waiting) await hand(id);
    const ids = waiting.map(({ id }) => id);
    if (ids.length > 0)
      await OutboxMail.update({ queuedAt: new Date() }, { where: { id: ids }, transaction });
    return ids.length;
  });
}
