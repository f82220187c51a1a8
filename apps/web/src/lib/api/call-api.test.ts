import { getDesign, getSession, refreshSession, renameDesign, signIn } from '@tipward/contract';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { ApiProblem } from './api-problem.ts';
import { callApi, callApiTagged } from './call-api.ts';
import { csrfToken, rememberCsrfToken } from './csrf-token.ts';
import { addressOf } from './request.ts';

const DESIGN = '0d1f6c3e-8a1b-4c57-9d0a-3b2f6a1c9e10';
const params = { designId: DESIGN };

interface Sent {
  readonly path: string;
  readonly method: string;
  readonly headers: Headers;
}
let sent: Sent[] = [];

/** Answers requests in order of arrival by path; the last answer of a path is repeated. */
function serve(answers: Record<string, (() => Response)[]>): void {
  vi.stubGlobal('fetch', (path: string, init: RequestInit) => {
    sent.push({ path, method: init.method ?? '', headers: new Headers(init.headers) });
    const queue = answers[path];
    const next = queue !== undefined && queue.length > 1 ? queue.shift() : queue?.[0];
    return next === undefined ? Promise.reject(new TypeError('no route')) : Promise.resolve(next());
  });
}

const ok =
  (body: unknown, headers: Record<string, string> = {}) =>
  () =>
    Response.json(body, { headers });
const refused =
  (status: number, code: string, more: object = {}) =>
  () =>
    Response.json({ type: `urn:${code}`, title: code, status, code, ...more }, { status });
const DESIGN_PATH = `/api/v1/designs/${DESIGN}`;
const REFRESH_PATH = '/api/v1/auth/refresh';
const SESSION_PATH = '/api/v1/auth/session';

beforeEach(() => {
  sent = [];
  rememberCsrfToken('token-of-the-session');
});
afterEach(() => {
  vi.unstubAllGlobals();
});

describe('addressOf', () => {
  it('fills parameters in and leaves empty query values out', () => {
    expect(addressOf(getDesign, { params: { designId: 'a/b?c' } })).toBe('/api/v1/designs/a%2Fb%3Fc');
    expect(addressOf(getSession, { query: { action: 'x y', actorId: undefined, programmeId: '' } })).toBe(
      '/api/v1/auth/session?action=x+y',
    );
  });
});

describe('callApi', () => {
  it('sends token and If-Match with a change, and neither with a reading', async () => {
    serve({ [DESIGN_PATH]: [ok({ name: 'B' }, { ETag: '"4"' })] });
    const { etag } = await callApiTagged(renameDesign, { params, body: { name: 'B' }, ifMatch: '"3"' });
    await callApi(getDesign, { params });
    expect(etag).toBe('"4"');
    expect(sent[0]?.method).toBe('PATCH');
    expect(sent[0]?.headers.get('X-CSRF-Token')).toBe('token-of-the-session');
    expect(sent[0]?.headers.get('If-Match')).toBe('"3"');
    expect(sent[1]?.headers.has('X-CSRF-Token')).toBe(false);
  });

  it('renews an expired session once for requests that fail together, then repeats them', async () => {
    serve({
      [DESIGN_PATH]: [refused(401, 'not-signed-in'), refused(401, 'not-signed-in'), ok({ name: 'A' })],
      [REFRESH_PATH]: [ok({ csrfToken: 'next' })],
    });
    const both = await Promise.all([callApi(getDesign, { params }), callApi(getDesign, { params })]);
    expect(both.map(({ name }) => name)).toEqual(['A', 'A']);
    expect(sent.filter(({ path }) => path === REFRESH_PATH)).toHaveLength(1);
    expect(csrfToken()).toBe('next');
  });

  it('tells that the session has ended when it cannot be renewed', async () => {
    serve({
      [DESIGN_PATH]: [refused(401, 'not-signed-in')],
      [REFRESH_PATH]: [refused(401, 'not-signed-in')],
    });
    await expect(callApi(getDesign, { params })).rejects.toMatchObject({ code: 'not-signed-in' });
    expect(sent.filter(({ path }) => path === DESIGN_PATH)).toHaveLength(1);
    expect(csrfToken()).toBeNull();
  });

  it('asks who is signed in again after a failed renewal: nobody is an answer', async () => {
    serve({
      [SESSION_PATH]: [refused(401, 'not-signed-in'), ok({ person: null, csrfToken: null })],
      [REFRESH_PATH]: [refused(401, 'not-signed-in')],
    });
    expect((await callApi(getSession, {})).person).toBeNull();
  });

  it('takes a wrong password for what it is and renews nothing', async () => {
    serve({ '/api/v1/auth/sign-in': [refused(401, 'not-signed-in')] });
    const body = { email: 'a@example.org', password: 'x' };
    await expect(callApi(signIn, { body })).rejects.toBeInstanceOf(ApiProblem);
    expect(sent).toHaveLength(1);
    expect(sent.some(({ path }) => path.endsWith(refreshSession.path))).toBe(false);
  });

  it('carries faults, and on a lost race the state as it stands', async () => {
    const faults = [{ field: 'name', value: '""', message: 'is empty' }];
    serve({ [DESIGN_PATH]: [refused(422, 'invalid', { faults })] });
    await expect(callApi(renameDesign, { params, body: { name: '' } })).rejects.toMatchObject({ faults });
    serve({ [DESIGN_PATH]: [refused(412, 'stale', { current: { name: 'C' }, currentETag: '"7"' })] });
    await expect(callApi(renameDesign, { params, body: { name: 'B' } })).rejects.toMatchObject({
      code: 'stale',
      current: { name: 'C' },
      currentETag: '"7"',
    });
  });

  it('says that no answer came, and what a wordless failure was', async () => {
    serve({});
    await expect(callApi(getDesign, { params })).rejects.toMatchObject({ code: 'unreachable' });
    serve({ [DESIGN_PATH]: [() => new Response('<html>bad gateway</html>', { status: 502 })] });
    await expect(callApi(getDesign, { params })).rejects.toMatchObject({ code: 'unexplained', status: 502 });
  });
});
