import request from 'supertest';
import type { Person } from '../src/models/person.ts';
import { csrfTokenOf } from '../src/services/auth/csrf.ts';
import { startFamily } from '../src/services/auth/token-families.ts';
import { ACCESS_COOKIE } from '../src/services/auth/session-cookies.ts';
import type { TestApi } from './test-api.ts';

/** Sends requests as one person: cookie and CSRF token go along, and each answer is a supertest test. */
function callerOf(api: TestApi, cookie: string | null, csrf: string | null) {
  const send = (method: 'get' | 'post' | 'put' | 'patch' | 'delete', path: string) => {
    const test = request(api.app)[method](`/api/v1${path}`);
    if (cookie !== null) test.set('Cookie', cookie);
    if (csrf !== null) test.set('X-CSRF-Token', csrf);
    return test;
  };
  return {
    send,
    get: (path: string) => send('get', path),
    post: (path: string, body?: object) => send('post', path).send(body),
    put: (path: string, body: object, ifMatch?: string) => {
      const test = send('put', path);
      return (ifMatch === undefined ? test : test.set('If-Match', ifMatch)).send(body);
    },
    patch: (path: string, body: object, ifMatch?: string) => {
      const test = send('patch', path);
      return (ifMatch === undefined ? test : test.set('If-Match', ifMatch)).send(body);
    },
    delete: (path: string, ifMatch?: string) => {
      const test = send('delete', path);
      return ifMatch === undefined ? test : test.set('If-Match', ifMatch);
    },
  };
}

export const nobody = (api: TestApi) => callerOf(api, null, null);

/** A live session without the round trip through sign-in, which has tests of its own. */
export async function sessionOf(api: TestApi, person: Person): Promise<{ cookie: string; csrf: string }> {
  const { pair, familyId } = await api.context.db.transaction((transaction) =>
    startFamily(api.context, transaction, person.id),
  );
  return { cookie: `${ACCESS_COOKIE}=${pair.access}`, csrf: csrfTokenOf(api.context, familyId) };
}

export async function callAs(api: TestApi, person: Person) {
  const { cookie, csrf } = await sessionOf(api, person);
  return callerOf(api, cookie, csrf);
}
