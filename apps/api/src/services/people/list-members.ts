import type { listMembers as operation, ResponseOf } from '@tipward/contract';
import { notFound } from '../../http/app-error.ts';
import { Membership } from '../../models/membership.ts';
import { Person } from '../../models/person.ts';
import { Programme } from '../../models/programme.ts';
import type { Actor } from '../../policies/actor.ts';
import { canSeeProgramme } from '../../policies/programmes.ts';

/** Members of a programme by name, closed accounts left out. */
export async function listMembers(actor: Actor, programmeId: string): Promise<ResponseOf<typeof operation>> {
  if (!canSeeProgramme(actor, { programmeId }) || (await Programme.findByPk(programmeId)) === null)
    throw notFound('This programme');
  const memberships = await Membership.findAll({ where: { programmeId } });
  const roles = new Map(memberships.map(({ personId, role }) => [personId, role]));
  const people = await Person.findAll({
    where: { id: [...roles.keys()], disabledAt: null },
    order: ['name', 'id'],
  });
  return {
    items: people.flatMap(({ id, name, email }) => {
      const role = roles.get(id);
      return role === undefined ? [] : [{ person: { id, name }, email, role }];
    }),
  };
}
