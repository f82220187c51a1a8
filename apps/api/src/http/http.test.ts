import { mkdir, mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { operation } from '@tipward/contract';
import express from 'express';
import { pino } from 'pino';
import { pinoHttp } from 'pino-http';
import request from 'supertest';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { makePerson } from '../../test/factories.ts';
import { callAs } from '../../test/sign-in.ts';
import { useTestApi } from '../../test/test-api.ts';
import { z } from 'zod';
import { createApp } from '../app.ts';
import { handleErrors } from './handle-errors.ts';
import { mountRoutes } from './mount-routes.ts';
import { publicRoute } from './route.ts';

const api = useTestApi();
let caller: Awaited<ReturnType<typeof callAs>>;
beforeAll(async () => {
  caller = await callAs(api(), await makePerson(api(), { isAdministrator: true }));
});
const raw = (text: string, type = 'application/json') =>
  caller.send('post', '/people/invitations').set('Content-Type', type).send(text);

describe('a body', () => {
  it('that is not JSON is answered with line and column', async () => {
    const { status, body, headers } = await raw('{\n  "email": oops }');
    expect([status, body.code]).toEqual([400, 'malformed-json']);
    expect(body.detail).toContain('Line 2, column 12: "oops" stands where a value should stand.');
    expect(headers['content-type']).toContain('application/problem+json');
  });

  it.each(['null', '5', '"text"', '[]', '[{}]'])('of %s is answered with what is missing', async (text) => {
    const { status, body } = await raw(text);
    expect([status, body.code]).toEqual([422, 'invalid']);
  });

  it('over 4 MB is refused', async () => {
    const { status, body } = await raw(JSON.stringify({ name: 'x'.repeat(4_300_000) }));
    expect([status, body.code]).toEqual([413, 'too-large']);
  });

  it('of another type or encoding is refused', async () => {
    expect((await raw('email=a', 'application/x-www-form-urlencoded')).status).toBe(415);
    expect((await raw('{}', 'application/json; charset=iso-8859-1')).status).toBe(415);
    expect((await raw('<a/>', 'text/xml')).body.code).toBe('unsupported-media-type');
  });

  it('cannot smuggle fields in through the prototype', async () => {
    const { status, body } = await raw(
      '{"email":"proto@example.org","name":"P","__proto__":{"isAdministrator":true}}',
    );
    if (status === 201) expect(body.isAdministrator).toBe(false);
    else expect(status).toBe(422);
  });
});

it('answers an address that cannot be read with 400', async () => {
  expect((await caller.get('/programmes/%E0%A4%A')).status).toBe(400);
});

it('answers an identifier that is none with 404', async () => {
  expect((await caller.get('/airfoils/1%27%20OR%201=1')).status).toBe(404);
});

it('names each request', async () => {
  const [one, two] = [await caller.get('/programmes'), await caller.get('/programmes')];
  expect(one.headers['x-request-id']).toMatch(/^[0-9a-f-]{36}$/u);
  expect(one.headers['x-request-id']).not.toBe(two.headers['x-request-id']);
});

describe('a handler', () => {
  const thing = operation({
    id: 'test.get-thing',
    summary: 'A thing',
    method: 'get',
    path: '/thing',
    access: 'public',
    status: 200,
    params: null,
    query: null,
    body: null,
    response: z.object({ name: z.string() }),
  });
  const answering = (handle: () => Promise<{ name: string }>) => {
    const app = express();
    app.use(pinoHttp({ logger: pino({ level: 'silent' }) }));
    app.use(mountRoutes(api().context, [publicRoute(thing, handle)]));
    app.use(handleErrors);
    return request(app).get('/thing');
  };

  it('that fails tells nothing of what failed inside', async () => {
    const { status, body, text } = await answering(() => Promise.reject(new Error('SELECT secret')));
    expect([status, body.code]).toEqual([500, 'internal']);
    expect(text).not.toContain('SELECT');
  });

  it('that answers with less or more than the contract is found in test mode', async () => {
    expect((await answering(() => Promise.resolve({ name: 'a' }))).status).toBe(200);
    const more = { name: 'a', passwordHash: 'b' };
    expect((await answering(() => Promise.resolve(more))).status).toBe(500);
    const less = { name: 1 } as unknown as { name: string };
    expect((await answering(() => Promise.resolve(less))).status).toBe(500);
  });
});

describe('the web application', () => {
  let folder: string;
  let app: ReturnType<typeof createApp>;
  beforeAll(async () => {
    folder = await mkdtemp(join(tmpdir(), 'tipward-web-'));
    await mkdir(join(folder, 'assets'));
    await writeFile(
      join(folder, 'index.html'),
      '<!doctype html><meta name="csp-nonce" content="__CSP_NONCE__">',
    );
    await writeFile(join(folder, 'assets', 'main-abc123.js'), 'export {};');
    await writeFile(join(folder, 'favicon.svg'), '<svg xmlns="http://www.w3.org/2000/svg"/>');
    const { context } = api();
    app = createApp({ ...context, config: { ...context.config, webDist: folder } });
  });
  afterAll(() => rm(folder, { recursive: true }));

  it.each(['/', '/index.html', '/programmes', '/versions/some-id/compare'])(
    '%s gets the page, fresh, with its nonce',
    async (path) => {
      const { status, text, headers } = await request(app).get(path).set('Accept', 'text/html');
      expect(status).toBe(200);
      expect(headers['cache-control']).toBe('no-store');
      const nonce = /content="([^"]+)"/u.exec(text)?.[1] ?? '';
      expect(nonce).toMatch(/^[A-Za-z0-9+/=]{24}$/u);
      expect(headers['content-security-policy']).toContain(`'nonce-${nonce}'`);
      expect(headers['content-security-policy']).not.toContain("script-src 'self' 'unsafe");
    },
  );

  it('keeps assets for good and does not take a page for a missing one', async () => {
    const { headers } = await request(app).get('/assets/main-abc123.js');
    expect(headers['cache-control']).toBe('public, max-age=31536000, immutable');
    expect((await request(app).get('/assets/main-old.js').set('Accept', 'text/html')).status).toBe(404);
    expect((await request(app).get('/favicon.svg')).headers['content-type']).toContain('image/svg+xml');
  });

  it('gives nothing outside its folder, and no page for an unknown address of the API', async () => {
    expect((await request(app).get('/..%2f..%2fetc/passwd')).text).not.toContain('root:');
    const { status, body } = await request(app).get('/api/v1/nowhere').set('Accept', 'text/html');
    expect([status, body.code]).toEqual([404, 'not-found']);
  });

  it('sends HSTS and Secure cookies only over TLS', async () => {
    const { context } = api();
    const tls = createApp({
      ...context,
      config: { ...context.config, publicUrl: 'https://tipward.example' },
    });
    expect((await request(tls).get('/api/v1/health')).headers['strict-transport-security']).toContain(
      'max-age',
    );
    expect((await request(app).get('/api/v1/health')).headers['strict-transport-security']).toBeUndefined();
    const cleared = await request(tls).post('/api/v1/auth/refresh');
    expect(String(cleared.headers['set-cookie'])).toMatch(/Secure/u);
  });
});
