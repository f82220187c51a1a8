import type { Context } from '../../context.ts';
import { inTransaction } from '../../db/in-transaction.ts';
import { notFound } from '../../http/app-error.ts';
import { Membership } from '../../models/membership.ts';
import type { Actor } from '../../policies/actor.ts';
import { writeAudit } from '../audit/write-audit.ts';

/** Takes a person out of a programme. What they wrote stays. */
export async function removeMember(
  context: Context,
  actor: Actor,
  programmeId: string,
  personId: string,
): Promise<void> {
  await inTransaction(context, async (transaction) => {
    const removed = await Membership.destroy({ where: { programmeId, personId }, transaction });
    if (removed === 0) throw notFound('This membership');
    await writeAudit(context, transaction, {
      actorId: actor.personId,
      action: 'people.role-taken',
      subjectKind: 'person',
      subjectId: personId,
      programmeId,
    });
  });
}
