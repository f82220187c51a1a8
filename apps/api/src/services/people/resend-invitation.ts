import type { Context } from '../../context.ts';
import { inTransaction } from '../../db/in-transaction.ts';
import { conflict } from '../../http/app-error.ts';
import type { Actor } from '../../policies/actor.ts';
import { writeAudit } from '../audit/write-audit.ts';
import { sendInvitation } from './invite-person.ts';
import { loadPerson } from './load-people.ts';

/** Sends the invitation again. @throws AppError `conflict` when it was taken up already or the account is closed */
export async function resendInvitation(context: Context, actor: Actor, personId: string): Promise<void> {
  await inTransaction(context, async (transaction) => {
    const person = await loadPerson(personId, transaction);
    if (person.hasPassword) throw conflict('The invitation was taken up already.');
    if (person.disabledAt !== null) throw conflict('The account is closed; open it first.');
    const roles = person.memberships.map(({ role, programmeName }) => `${role} in ${programmeName}`);
    await sendInvitation(context, transaction, actor, person, roles);
    await writeAudit(context, transaction, {
      actorId: actor.personId,
      action: 'people.invitation-resent',
      subjectKind: 'person',
      subjectId: personId,
    });
  });
}
