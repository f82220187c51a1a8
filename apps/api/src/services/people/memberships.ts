import type { Role } from '@tipward/contract';
import type { Transaction } from 'sequelize';
import { invalid, notFound } from '../../http/app-error.ts';
import { Membership } from '../../models/membership.ts';
import { Person } from '../../models/person.ts';
import { Programme } from '../../models/programme.ts';

export interface GivenRole {
  readonly programmeId: string;
  readonly role: Role;
}

/** @throws AppError `not-found` */
export async function requireProgramme(transaction: Transaction, programmeId: string): Promise<Programme> {
  const programme = await Programme.findByPk(programmeId, { transaction });
  if (programme === null) throw notFound('This programme');
  return programme;
}

/** @throws AppError `not-found` */
export async function requirePerson(transaction: Transaction, personId: string): Promise<Person> {
  const person = await Person.findByPk(personId, { transaction, lock: transaction.LOCK.UPDATE });
  if (person === null) throw notFound('This person');
  return person;
}

/** Names of the programmes given. @throws AppError `invalid` naming each one that is unknown or stands twice */
export async function requireProgrammes(
  transaction: Transaction,
  given: readonly GivenRole[],
): Promise<Map<string, string>> {
  const ids = given.map(({ programmeId }) => programmeId);
  const found = await Programme.findAll({ where: { id: ids }, attributes: ['id', 'name'], transaction });
  const names = new Map(found.map(({ id, name }) => [id, name]));
  const faults = ids.flatMap((id, i) => {
    const fault = (message: string) => [{ field: `memberships[${i}].programmeId`, value: id, message }];
    if (!names.has(id)) return fault('Programme is unknown; allowed: a programme of this installation');
    return ids.indexOf(id) === i ? [] : fault('Programme stands twice; allowed: one role in a programme');
  });
  if (faults.length > 0) throw invalid(faults);
  return names;
}

/** Gives a role; takes the place of the one held before, which is returned. */
export async function giveRole(
  transaction: Transaction,
  personId: string,
  { programmeId, role }: GivenRole,
): Promise<Role | null> {
  const held = await Membership.findOne({ where: { programmeId, personId }, transaction });
  const before = held?.role ?? null;
  if (held === null) await Membership.create({ programmeId, personId, role }, { transaction });
  else await held.update({ role }, { transaction });
  return before;
}
