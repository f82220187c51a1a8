import { Membership } from '../../models/membership.ts';
import { Person } from '../../models/person.ts';
import type { Actor } from '../../policies/actor.ts';

/** A person with the rights they hold now; null when there is none or they are disabled. */
export async function loadActor(personId: string): Promise<Actor | null> {
  const [person, memberships] = await Promise.all([
    Person.findByPk(personId),
    Membership.findAll({ where: { personId } }),
  ]);
  if (person === null || person.disabledAt !== null) return null;
  return {
    personId: person.id,
    name: person.name,
    email: person.email,
    isAdministrator: person.isAdministrator,
    roles: new Map(memberships.map((membership) => [membership.programmeId, membership.role])),
  };
}
