import type { Person } from '@tipward/contract';
import { presentPerson } from '../../presenters/person.ts';
import { loadPeople } from './load-people.ts';

export async function listPeople(): Promise<{ items: Person[] }> {
  return { items: (await loadPeople()).map(presentPerson) };
}
