import type { Transaction } from 'sequelize';
import { OutboxMail } from '../../models/outbox-mail.ts';

/** A message before it is addressed: what the templates in mail/templates make. */
export interface Letter {
  /** Which template it is, for the log and the queue. */
  readonly kind: string;
  readonly subject: string;
  readonly text: string;
}

/** Puts a message for each address into the outbox, in the transaction of what caused it. */
export async function writeMail(
  transaction: Transaction,
  addresses: readonly string[],
  letter: Letter,
): Promise<void> {
  await OutboxMail.bulkCreate(
    addresses.map((toAddress) => ({ ...letter, toAddress })),
    { transaction },
  );
}
