import type { BodyOf, Person as PersonView, updatePerson as operation } from '@tipward/contract';
import { Op, type Transaction } from 'sequelize';
import type { Context } from '../../context.ts';
import { inTransaction } from '../../db/in-transaction.ts';
import { conflict } from '../../http/app-error.ts';
import { Person } from '../../models/person.ts';
import type { Actor } from '../../policies/actor.ts';
import { presentPerson } from '../../presenters/person.ts';
import { writeAudit } from '../audit/write-audit.ts';
import { endLinks } from '../auth/one-time-links.ts';
import { endFamiliesOf } from '../auth/token-families.ts';
import { loadPerson } from './load-people.ts';
import { requirePerson } from './memberships.ts';

type Given = BodyOf<typeof operation>;

/** Someone must be left who can let people in. */
async function requireOtherAdministrator(transaction: Transaction, personId: string): Promise<void> {
  const others = await Person.findAll({
    where: { id: { [Op.ne]: personId }, isAdministrator: true, disabledAt: null },
    lock: transaction.LOCK.UPDATE,
    transaction,
  });
  if (others.length === 0) throw conflict('This is the last administrator; make someone else one first.');
}

async function closeAccount(transaction: Transaction, personId: string): Promise<void> {
  await endFamiliesOf(transaction, personId, 'disabled');
  await endLinks(transaction, personId, 'invitation');
  await endLinks(transaction, personId, 'password-reset');
}

/** Makes or unmakes an administrator, closes or opens an account. A closed account is out at once. */
export async function updatePerson(
  context: Context,
  actor: Actor,
  personId: string,
  given: Given,
): Promise<PersonView> {
  return inTransaction(context, async (transaction) => {
    const person = await requirePerson(transaction, personId);
    const loses = given.isAdministrator === false || given.disabled === true;
    if (person.isAdministrator && person.disabledAt === null && loses)
      await requireOtherAdministrator(transaction, personId);
    if (given.isAdministrator !== undefined) person.isAdministrator = given.isAdministrator;
    if (given.disabled === true) person.disabledAt ??= new Date();
    if (given.disabled === false) person.disabledAt = null;
    await person.save({ transaction });
    if (given.disabled === true) await closeAccount(transaction, personId);
    const view = presentPerson(await loadPerson(personId, transaction));
    await writeAudit(context, transaction, {
      actorId: actor.personId,
      action: 'people.changed',
      subjectKind: 'person',
      subjectId: personId,
      detail: { ...given },
    });
    return view;
  });
}
