import { z } from 'zod';
import { operation } from '../operation.ts';

export const getOpenapi = operation({
  id: 'system.get-openapi',
  summary: 'This interface as OpenAPI 3.1',
  method: 'get',
  path: '/openapi.json',
  access: 'public',
  status: 200,
  params: null,
  query: null,
  body: null,
  response: z.record(z.string(), z.unknown()),
});
