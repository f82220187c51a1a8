import { z } from 'zod';
import { operation } from '../operation.ts';

export const verifyAudit = operation({
  id: 'audit.verify-audit',
  summary: 'Walk the audit chain and say whether it holds',
  method: 'get',
  path: '/audit/verification',
  access: 'administrator',
  status: 200,
  params: null,
  query: null,
  body: null,
  response: z.object({
    holds: z.boolean(),
    events: z.number(),
    firstBroken: z.number().nullable(),
    lastHash: z.string(),
  }),
});
