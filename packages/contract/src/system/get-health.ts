import { z } from 'zod';
import { operation } from '../operation.ts';

export const getHealth = operation({
  id: 'system.get-health',
  summary: 'Whether the server, its database and its migrations are well',
  method: 'get',
  path: '/health',
  access: 'public',
  status: 200,
  params: null,
  query: null,
  body: null,
  response: z.object({
    status: z.enum(['ok', 'failing']),
    version: z.string(),
    database: z.enum(['ok', 'failing']),
  }),
});
