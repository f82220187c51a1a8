import { Person } from '../../models/person.ts';
import { presentPersonRef, type PersonRefs } from '../../presenters/person-ref.ts';

export type { PersonRefs };

/** Names of the people that records point to, in one query. People are never deleted, so each id has a name. */
export async function loadPersonRefs(ids: Iterable<string>): Promise<PersonRefs> {
  const people = await Person.findAll({ where: { id: [...new Set(ids)] }, attributes: ['id', 'name'] });
  const byId = new Map(people.map((person) => [person.id, presentPersonRef(person)]));
  return (id) => {
    const found = byId.get(id);
    if (found === undefined) throw new Error(`person ${id} is not among those loaded`);
    return found;
  };
}
