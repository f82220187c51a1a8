import { operations } from '@tipward/contract';
import { expect, it } from 'vitest';
import { nobody } from '../../../test/sign-in.ts';
import { useTestApi } from '../../../test/test-api.ts';

const api = useTestApi();

it('is well when the database has the migrations of the program', async () => {
  const { status, body, headers } = await nobody(api()).get('/health');
  expect(status).toBe(200);
  expect(body).toEqual({ status: 'ok', version: '0.1.0', database: 'ok' });
  expect(headers['x-powered-by']).toBeUndefined();
  expect(headers['cache-control']).toBe('no-store');
  expect(headers['content-security-policy']).toContain("script-src 'self'");
  expect(headers['content-security-policy']).toContain("frame-ancestors 'none'");
});

it('describes every operation as OpenAPI 3.1', async () => {
  const { body } = await nobody(api()).get('/openapi.json');
  expect(body.openapi).toBe('3.1.0');
  const described = Object.values(
    body.paths as Record<string, Record<string, { operationId: string }>>,
  ).flatMap((path) => Object.values(path).map(({ operationId }) => operationId));
  expect(described.toSorted()).toEqual(operations.map(({ id }) => id).toSorted());
  const save = body.paths['/drafts/{draftId}'].put;
  expect(save.parameters.map(({ name }: { name: string }) => name)).toEqual([
    'draftId',
    'X-CSRF-Token',
    'If-Match',
  ]);
});

it('answers an unknown address with a problem', async () => {
  const { status, body, headers } = await nobody(api()).get('/nowhere');
  expect(status).toBe(404);
  expect(headers['content-type']).toContain('application/problem+json');
  expect(body).toMatchObject({ code: 'not-found', instance: '/api/v1/nowhere' });
});
