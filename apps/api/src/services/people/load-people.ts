import type { Membership as MembershipView } from '@tipward/contract';
import type { Transaction, WhereOptions } from 'sequelize';
import { notFound } from '../../http/app-error.ts';
import { Credential } from '../../models/credential.ts';
import { Membership } from '../../models/membership.ts';
import { Person } from '../../models/person.ts';
import { Programme } from '../../models/programme.ts';
import type { PersonRecord } from '../../presenters/person.ts';

async function loadMemberships(
  personIds: readonly string[],
  transaction: Transaction | null,
): Promise<Map<string, MembershipView[]>> {
  const memberships = await Membership.findAll({ where: { personId: [...personIds] }, transaction });
  const programmes = await Programme.findAll({
    where: { id: [...new Set(memberships.map(({ programmeId }) => programmeId))] },
    attributes: ['id', 'name'],
    transaction,
  });
  const names = new Map(programmes.map(({ id, name }) => [id, name]));
  const byPerson = new Map<string, MembershipView[]>();
  for (const { personId, programmeId, role } of memberships) {
    const list = byPerson.get(personId) ?? [];
    list.push({ programmeId, programmeName: names.get(programmeId) ?? '', role });
    byPerson.set(personId, list);
  }
  for (const list of byPerson.values())
    list.sort((a, b) => a.programmeName.localeCompare(b.programmeName, 'en'));
  return byPerson;
}

/** People with their memberships and whether they have taken up their invitation, by name. */
export async function loadPeople(
  where: WhereOptions<Person> = {},
  transaction: Transaction | null = null,
): Promise<PersonRecord[]> {
  const people = await Person.findAll({ where, order: ['name', 'id'], transaction });
  const ids = people.map(({ id }) => id);
  const credentials = await Credential.findAll({
    where: { personId: ids },
    attributes: ['personId'],
    transaction,
  });
  const withPassword = new Set(credentials.map(({ personId }) => personId));
  const memberships = await loadMemberships(ids, transaction);
  return people.map(({ id, name, email, isAdministrator, disabledAt, lastSeenAt }) => ({
    ...{ id, name, email, isAdministrator, disabledAt, lastSeenAt },
    hasPassword: withPassword.has(id),
    memberships: memberships.get(id) ?? [],
  }));
}

/** @throws AppError `not-found` */
export async function loadPerson(id: string, transaction: Transaction | null = null): Promise<PersonRecord> {
  const [person] = await loadPeople({ id }, transaction);
  if (person === undefined) throw notFound('This person');
  return person;
}
