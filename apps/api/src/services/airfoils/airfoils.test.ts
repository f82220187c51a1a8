import { beforeAll, expect, it } from 'vitest';
import { airfoilInput, makePerson, makeProgramme, sha256Of } from '../../../test/factories.ts';
import { callAs } from '../../../test/sign-in.ts';
import { useTestApi } from '../../../test/test-api.ts';
import { AirfoilRecord } from '../../models/airfoil-record.ts';

const api = useTestApi();
let caller: Awaited<ReturnType<typeof callAs>>;
beforeAll(async () => {
  const person = await makePerson(api());
  await makeProgramme(person, [[person, 'aerodynamicist']]);
  caller = await callAs(api(), person);
});

it('keeps an airfoil to the last digit and pins it by a hash that its name does not enter', async () => {
  const given = airfoilInput('SM-18');
  const added = await caller.post('/airfoils', given);
  expect(added.status).toBe(201);
  const { body } = await caller.get(`/airfoils/${added.body.id}`);
  expect(body).toEqual(added.body);
  expect(body).toMatchObject({ name: 'SM-18', polarCount: 1, reynolds: [1e6], surfaceStates: ['clean'] });
  expect(body.polars).toEqual(given.polars);
  const { thicknessPct, outline, polars } = given;
  expect(body.polarSetHash).toBe(sha256Of({ thicknessPct, outline, polars }));
  const renamed = await caller.post('/airfoils', { ...given, name: 'SM-18 again' });
  expect(renamed.body.polarSetHash).toBe(body.polarSetHash);
  const { body: list } = await caller.get('/airfoils');
  expect(list.items.map(({ name }: { name: string }) => name)).toContain('SM-18');
  expect(list.items[0].polars).toBeUndefined();
});

it('refuses a name that is taken', async () => {
  await caller.post('/airfoils', airfoilInput('Twice'));
  expect((await caller.post('/airfoils', airfoilInput('TWICE'))).status).toBe(409);
});

it('names each row that is wrong and keeps nothing', async () => {
  const before = await AirfoilRecord.count();
  const given = airfoilInput('Wrong');
  const [polar = given.polars[0]] = given.polars;
  const { status, body } = await caller.post('/airfoils', {
    ...given,
    polars: [{ ...polar, alphaDeg: [0, 5, 5, 4], cl: [0, 0.5, 0.6, 0.7], cd: [0.01, 0.01, 0.01] }],
  });
  expect(status).toBe(422);
  expect(body.faults.map(({ field }: { field: string }) => field)).toEqual([
    'polars[0].cd',
    'polars[0].alphaDeg[2]',
    'polars[0].alphaDeg[3]',
  ]);
  expect(await AirfoilRecord.count()).toBe(before);
});
