import type { BodyOf, invitePerson as operation, Person as PersonView } from '@tipward/contract';
import { UniqueConstraintError, type Transaction } from 'sequelize';
import type { Context } from '../../context.ts';
import { inTransaction } from '../../db/in-transaction.ts';
import { conflict } from '../../http/app-error.ts';
import { invitationLetter } from '../../mail/templates/invitation.ts';
import { Person } from '../../models/person.ts';
import type { Actor } from '../../policies/actor.ts';
import { presentPerson } from '../../presenters/person.ts';
import { writeAudit } from '../audit/write-audit.ts';
import { createLink } from '../auth/one-time-links.ts';
import { writeMail } from '../mail/write-mail.ts';
import { loadPerson } from './load-people.ts';
import { giveRole, requireProgrammes } from './memberships.ts';

type Given = BodyOf<typeof operation>;

async function createPerson(transaction: Transaction, given: Given): Promise<Person> {
  const known = await Person.findOne({ where: { email: given.email }, transaction });
  if (known !== null) throw conflict('Someone with this e-mail is here already.');
  const { name, email, isAdministrator } = given;
  try {
    return await Person.create({ name, email, isAdministrator }, { transaction });
  } catch (error) {
    if (error instanceof UniqueConstraintError) throw conflict('Someone with this e-mail is here already.');
    throw error;
  }
}

/** Sends the invitation with a new link; an earlier link of the person ends. */
export async function sendInvitation(
  context: Context,
  transaction: Transaction,
  actor: Actor,
  person: { readonly id: string; readonly name: string; readonly email: string },
  roles: readonly string[],
): Promise<void> {
  const link = await createLink(context, transaction, person.id, 'invitation');
  const letter = invitationLetter({ name: person.name, invitedBy: actor.name, link, roles });
  await writeMail(transaction, [person.email], letter);
}

/** Adds a person with their roles and sends them a link to set their password. */
export async function invitePerson(context: Context, actor: Actor, given: Given): Promise<PersonView> {
  return inTransaction(context, async (transaction) => {
    const names = await requireProgrammes(transaction, given.memberships);
    const person = await createPerson(transaction, given);
    for (const membership of given.memberships) await giveRole(transaction, person.id, membership);
    const roles = given.memberships.map(
      ({ programmeId, role }) => `${role} in ${names.get(programmeId) ?? ''}`,
    );
    if (given.isAdministrator) roles.unshift('administrator');
    await sendInvitation(context, transaction, actor, person, roles);
    const view = presentPerson(await loadPerson(person.id, transaction));
    await writeAudit(context, transaction, {
      actorId: actor.personId,
      action: 'people.invited',
      subjectKind: 'person',
      subjectId: person.id,
      detail: { email: person.email, isAdministrator: given.isAdministrator, memberships: given.memberships },
    });
    return view;
  });
}
