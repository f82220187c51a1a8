import type { PersonRef } from '@tipward/contract';

/** The name behind an id, from people loaded beforehand. */
export type PersonRefs = (id: string) => PersonRef;

/** Someone by id and name, as records name their authors. */
export const presentPersonRef = (person: { id: string; name: string }): PersonRef => ({
  id: person.id,
  name: person.name,
});
