import type { Role } from '@tipward/contract';
import { Membership } from '../../models/membership.ts';
import { Person } from '../../models/person.ts';

/** E-mail addresses of active members with one of the roles, without the person whose act it is. */
export async function addressesOf(
  programmeId: string,
  roles: readonly Role[],
  exceptPersonId: string,
): Promise<string[]> {
  const members = await Membership.findAll({ where: { programmeId, role: [...roles] } });
  return addressesOfPeople(
    members.map((member) => member.personId),
    exceptPersonId,
  );
}

export async function addressesOfPeople(
  personIds: readonly string[],
  exceptPersonId: string,
): Promise<string[]> {
  const people = await Person.findAll({
    where: { id: personIds.filter((id) => id !== exceptPersonId), disabledAt: null },
  });
  return people.map((person) => person.email);
}
