import type { z } from 'zod';
import type { Context } from '../../context.ts';
import { inTransaction } from '../../db/in-transaction.ts';
import type { Postman } from '../../mail/postman.ts';
import { OutboxMail } from '../../models/outbox-mail.ts';
import type { sendMailJob } from '../definitions/send-mail.ts';

type Payload = z.infer<typeof sendMailJob.payload>;

/**
 * Sends a message unless it was sent. The row stays locked while it goes out, so two workers never send the same one; a
 * message whose process stops between the mail server's answer and the commit goes out twice.
 * @throws what the mail server or the connection says; the queue tries again
 */
export async function sendMail(context: Context, postman: Postman, { outboxId }: Payload): Promise<void> {
  try {
    await inTransaction(context, async (transaction) => {
      const mail = await OutboxMail.findOne({
        where: { id: outboxId, sentAt: null },
        lock: transaction.LOCK.UPDATE,
        transaction,
      });
      if (mail === null) return;
      const { id, toAddress, subject, text } = mail;
      await postman.deliver({ id, to: toAddress, subject, text });
      await mail.update(
        { sentAt: new Date(), attempts: mail.attempts + 1, lastError: null },
        { transaction },
      );
    });
  } catch (error) {
    const lastError = error instanceof Error ? error.message : String(error);
    await OutboxMail.increment('attempts', { where: { id: outboxId } });
    await OutboxMail.update({ lastError }, { where: { id: outboxId, sentAt: null } });
    throw error;
  }
}
