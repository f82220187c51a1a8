import type { Context } from '../../context.ts';
import { inTransaction } from '../../db/in-transaction.ts';
import type { Cookies } from '../../http/cookies.ts';
import type { Actor } from '../../policies/actor.ts';
import { writeAudit } from '../audit/write-audit.ts';
import { clearSessionCookies } from './session-cookies.ts';
import { endFamiliesOf, endFamily } from './token-families.ts';

/** Ends this session. */
export async function signOut(
  context: Context,
  actor: Actor,
  cookies: Cookies,
  familyId: string | null,
): Promise<void> {
  await inTransaction(context, async (transaction) => {
    if (familyId !== null) await endFamily(transaction, familyId, 'signed-out');
    await writeAudit(context, transaction, {
      actorId: actor.personId,
      action: 'auth.signed-out',
      subjectKind: 'person',
      subjectId: actor.personId,
    });
  });
  clearSessionCookies(cookies);
}

/** Ends every session of the person, on every device. */
export async function signOutEverywhere(context: Context, actor: Actor, cookies: Cookies): Promise<void> {
  await inTransaction(context, async (transaction) => {
    const sessions = await endFamiliesOf(transaction, actor.personId, 'signed-out-everywhere');
    await writeAudit(context, transaction, {
      actorId: actor.personId,
      action: 'auth.signed-out-everywhere',
      subjectKind: 'person',
      subjectId: actor.personId,
      detail: { sessions },
    });
  });
  clearSessionCookies(cookies);
}
