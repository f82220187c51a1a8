import type { Person } from '../../src/models/person.ts';
import type { Programme } from '../../src/models/programme.ts';
import { makePerson, makeProgramme } from '../factories.ts';
import type { TestApi } from '../test-api.ts';

/** One programme with a person in each role, an administrator without a role in it, and someone with no role at all. */
export interface World {
  readonly api: TestApi;
  readonly programme: Programme;
  readonly people: Readonly<
    Record<'administrator' | 'aerodynamicist' | 'lead' | 'reader' | 'outsider', Person>
  >;
}

export async function makeWorld(api: TestApi): Promise<World> {
  const administrator = await makePerson(api, { isAdministrator: true });
  const aerodynamicist = await makePerson(api);
  const lead = await makePerson(api);
  const reader = await makePerson(api);
  const outsider = await makePerson(api);
  const programme = await makeProgramme(lead, [
    [aerodynamicist, 'aerodynamicist'],
    [lead, 'lead'],
    [reader, 'reader'],
  ]);
  return { api, programme, people: { administrator, aerodynamicist, lead, reader, outsider } };
}
