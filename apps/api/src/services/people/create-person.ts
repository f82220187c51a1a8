import type { Context } from '../../context.ts';
import { inTransaction } from '../../db/in-transaction.ts';
import { Person } from '../../models/person.ts';
import { writeAudit } from '../audit/write-audit.ts';
import { hashPassword } from '../auth/password.ts';
import { setPassword } from '../auth/set-password.ts';

interface Given {
  readonly name: string;
  readonly email: string;
  readonly password: string;
  readonly isAdministrator: boolean;
}

/** Adds a person with a password, without an invitation; for the demonstration only, never from a request. */
export async function createPerson(context: Context, given: Given): Promise<{ readonly id: string }> {
  const passwordHash = await hashPassword(context, given.password);
  const { name, email, isAdministrator } = given;
  return inTransaction(context, async (transaction) => {
    const person = await Person.create(
      { name, email: email.toLowerCase(), isAdministrator },
      { transaction },
    );
    await setPassword(transaction, person.id, passwordHash);
    await writeAudit(context, transaction, {
      actorId: null,
      action: 'people.created',
      subjectKind: 'person',
      subjectId: person.id,
      detail: { email: person.email, isAdministrator },
    });
    return { id: person.id };
  });
}
