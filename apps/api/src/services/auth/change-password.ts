import type { BodyOf, changePassword as operation } from '@tipward/contract';
import type { Context } from '../../context.ts';
import { inTransaction } from '../../db/in-transaction.ts';
import type { Actor } from '../../policies/actor.ts';
import { writeAudit } from '../audit/write-audit.ts';
import { confirmPassword } from './confirm-password.ts';
import { hashPassword } from './password.ts';
import { setPassword } from './set-password.ts';
import { endFamiliesOf } from './token-families.ts';

/** Changes the caller's password and ends all their other sessions. */
export async function changePassword(
  context: Context,
  actor: Actor,
  given: BodyOf<typeof operation>,
  familyId: string | null,
): Promise<void> {
  await confirmPassword(context, actor, given.currentPassword, 'currentPassword');
  const passwordHash = await hashPassword(context, given.newPassword);
  await inTransaction(context, async (transaction) => {
    await setPassword(transaction, actor.personId, passwordHash);
    await endFamiliesOf(transaction, actor.personId, 'password-changed', familyId);
    await writeAudit(context, transaction, {
      actorId: actor.personId,
      action: 'auth.password-changed',
      subjectKind: 'person',
      subjectId: actor.personId,
    });
  });
}
