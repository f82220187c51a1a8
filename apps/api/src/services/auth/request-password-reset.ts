import { setTimeout as pause } from 'node:timers/promises';
import type { Context } from '../../context.ts';
import { inTransaction } from '../../db/in-transaction.ts';
import { passwordResetLetter } from '../../mail/templates/password-reset.ts';
import { Credential } from '../../models/credential.ts';
import { Person } from '../../models/person.ts';
import { writeAudit } from '../audit/write-audit.ts';
import { writeMail } from '../mail/write-mail.ts';
import { createLink } from './one-time-links.ts';

/** Longer than the work for a known address takes, so the time of the answer does not tell. */
const ANSWER_AFTER_MS = 250;

async function sendLink(context: Context, email: string): Promise<void> {
  const person = await Person.findOne({ where: { email, disabledAt: null } });
  const credential = person === null ? null : await Credential.findByPk(person.id);
  if (person === null || credential === null) return;
  await inTransaction(context, async (transaction) => {
    const link = await createLink(context, transaction, person.id, 'password-reset');
    await writeMail(transaction, [person.email], passwordResetLetter({ name: person.name, link }));
    await writeAudit(context, transaction, {
      actorId: null,
      action: 'auth.password-reset-asked',
      subjectKind: 'person',
      subjectId: person.id,
    });
  });
}

/** Sends a reset link to someone who has a password here; for anyone else nothing happens, and neither answer tells. */
export async function requestPasswordReset(context: Context, email: string): Promise<void> {
  await Promise.all([sendLink(context, email), pause(ANSWER_AFTER_MS)]);
}
