import { z } from 'zod';
import { operation } from '../operation.ts';
import { auditEvent } from './audit-event.ts';
import { page, pageQuery } from '../values/page.ts';
import { idValue } from '../values/text.ts';

export const listAuditEvents = operation({
  id: 'audit.list-audit-events',
  summary: 'Audit events, newest first',
  method: 'get',
  path: '/audit',
  access: 'administrator',
  status: 200,
  params: null,
  query: pageQuery.extend({
    action: z.string().max(100, 'allowed: at most 100 characters').optional(),
    actorId: idValue('Actor').optional(),
    programmeId: idValue('Programme').optional(),
  }),
  body: null,
  response: page(auditEvent),
});
