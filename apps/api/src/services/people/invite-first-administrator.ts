import type { Context } from '../../context.ts';
import { inTransaction } from '../../db/in-transaction.ts';
import { conflict } from '../../http/app-error.ts';
import { Person } from '../../models/person.ts';
import { writeAudit } from '../audit/write-audit.ts';
import { createLink } from '../auth/one-time-links.ts';

/**
 * Makes the first person of an installation, an administrator, and gives their link to whoever runs the command; there
 * is nobody yet who could invite them.
 * @throws AppError `conflict` when someone is here already
 */
export async function inviteFirstAdministrator(
  context: Context,
  { email, name }: { readonly email: string; readonly name: string },
): Promise<string> {
  return inTransaction(context, async (transaction) => {
    if ((await Person.count({ transaction })) > 0)
      throw conflict('The installation has people already: an administrator among them invites the others.');
    const person = await Person.create({ email, name, isAdministrator: true }, { transaction });
    const link = await createLink(context, transaction, person.id, 'invitation');
    await writeAudit(context, transaction, {
      actorId: null,
      action: 'people.first-administrator-invited',
      subjectKind: 'person',
      subjectId: person.id,
      detail: { email },
    });
    return link;
  });
}
