import type { Context } from '../../context.ts';
import { inTransaction } from '../../db/in-transaction.ts';
import type { Actor } from '../../policies/actor.ts';
import { writeAudit } from '../audit/write-audit.ts';
import { giveRole, requirePerson, requireProgramme, type GivenRole } from './memberships.ts';

/** Gives a person a role in a programme, in place of the one they held. */
export async function setMember(
  context: Context,
  actor: Actor,
  personId: string,
  given: GivenRole,
): Promise<void> {
  await inTransaction(context, async (transaction) => {
    await requireProgramme(transaction, given.programmeId);
    await requirePerson(transaction, personId);
    const before = await giveRole(transaction, personId, given);
    if (before === given.role) return;
    await writeAudit(context, transaction, {
      actorId: actor.personId,
      action: 'people.role-given',
      subjectKind: 'person',
      subjectId: personId,
      programmeId: given.programmeId,
      detail: { role: given.role, before },
    });
  });
}
