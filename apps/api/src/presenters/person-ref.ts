import type { PersonRef } from '@tipward/contract';

/** Someone by id and name, as records name their authors. */
export const presentPersonRef = (person: { id: string; name: string }): PersonRef => ({
  id: person.id,
  name: person.name,
});
