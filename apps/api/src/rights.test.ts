import { operations, type Method } from '@tipward/contract';
import request from 'supertest';
import { beforeAll, describe, expect, it } from 'vitest';
import { CALLERS, type CallerName, type RightsRow } from '../test/rights/rights-row.ts';
import { rightsTable } from '../test/rights/table.ts';
import { makeWorld, type World } from '../test/rights/world.ts';
import { sessionOf } from '../test/sign-in.ts';
import { useTestApi } from '../test/test-api.ts';
import { routes } from './routes/index.ts';

const api = useTestApi({ signInFailuresAllowed: 1000 });

async function call(world: World, { operation, request: make }: RightsRow, caller: CallerName) {
  const given = await make(world, caller);
  let path = operation.path;
  for (const [name, value] of Object.entries(given.params ?? {})) path = path.replace(`:${name}`, value);
  const session = caller === 'nobody' ? null : await sessionOf(world.api, world.people[caller]);
  const test = request(world.api.app)[operation.method](`/api/v1${path}${given.query ?? ''}`);
  const cookies = [session?.cookie, given.cookie].filter((cookie) => cookie !== undefined);
  if (cookies.length > 0) test.set('Cookie', cookies.join('; '));
  if (session !== null) test.set('X-CSRF-Token', session.csrf);
  if (given.ifMatch !== undefined) test.set('If-Match', given.ifMatch);
  return test.send(given.body);
}

it('names every operation of the contract once, and every route', () => {
  const named = rightsTable.map(({ operation }) => operation.id);
  expect(named.toSorted()).toEqual(operations.map(({ id }) => id).toSorted());
  const answered = routes.map(({ operation }) => operation.id);
  expect(answered.toSorted()).toEqual(rightsTable.map(({ operation }) => operation.id).toSorted());
});

describe.each(rightsTable.map((entry) => [entry.operation.id, entry] as const))('%s', (_id, entry) => {
  let world: World;
  beforeAll(async () => {
    world = await makeWorld(api());
  });

  it.each(CALLERS)('as %s', async (caller) => {
    const { status, body } = await call(world, entry, caller);
    expect(status, JSON.stringify(body)).toBe(entry.expected[caller]);
    if (status === 401) expect(body.code).toBe('not-signed-in');
    if (status === 403) expect(body.code).toBe('forbidden');
  });
});

const changes = rightsTable
  .map(({ operation }) => operation)
  .filter(({ access, method }) => access !== 'public' && method !== 'get');

describe('a change', () => {
  let world: World;
  beforeAll(async () => {
    world = await makeWorld(api());
  });

  it.each(changes.map((operation) => [operation.id, operation] as const))(
    '%s needs the CSRF token of its own session and comes from no other site',
    async (_id, operation) => {
      const session = await sessionOf(world.api, world.people.administrator);
      const other = await sessionOf(world.api, world.people.lead);
      const path = operation.path.replaceAll(/:\w+/gu, world.programme.id);
      const agent = request(world.api.app);
      const start = (method: Method, to: string) => agent[method](to);
      const send = (headers: Record<string, string>) =>
        start(operation.method, `/api/v1${path}`).set('Cookie', session.cookie).set(headers).send({});
      for (const headers of [
        {},
        { 'X-CSRF-Token': other.csrf },
        { 'X-CSRF-Token': session.csrf, 'Sec-Fetch-Site': 'cross-site' },
        { 'X-CSRF-Token': session.csrf, 'Sec-Fetch-Site': 'same-site' },
        { 'X-CSRF-Token': session.csrf, Origin: 'https://elsewhere.example' },
        { 'X-CSRF-Token': session.csrf, Origin: 'null' },
      ])
        expect((await send(headers)).status, JSON.stringify(headers)).toBe(403);
    },
  );
});
