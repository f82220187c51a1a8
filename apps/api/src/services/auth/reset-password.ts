import type { BodyOf, resetPassword as operation } from '@tipward/contract';
import type { Context } from '../../context.ts';
import { inTransaction } from '../../db/in-transaction.ts';
import { writeAudit } from '../audit/write-audit.ts';
import { useLink } from './one-time-links.ts';
import { hashPassword } from './password.ts';
import { setPassword } from './set-password.ts';
import { endFamiliesOf } from './token-families.ts';

/** Sets a new password with the link of the e-mail and ends every session of the person. */
export async function resetPassword(context: Context, given: BodyOf<typeof operation>): Promise<void> {
  const passwordHash = await hashPassword(context, given.password);
  await inTransaction(context, async (transaction) => {
    const personId = await useLink(transaction, given.token, 'password-reset');
    await setPassword(transaction, personId, passwordHash);
    await endFamiliesOf(transaction, personId, 'password-changed');
    await writeAudit(context, transaction, {
      actorId: personId,
      action: 'auth.password-reset',
      subjectKind: 'person',
      subjectId: personId,
    });
  });
}
