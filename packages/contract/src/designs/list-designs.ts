import { z } from 'zod';
import { operation } from '../operation.ts';
import { idValue } from '../values/text.ts';
import { designSummary } from './design.ts';
import { list } from '../values/page.ts';

export const listDesigns = operation({
  id: 'designs.list-designs',
  summary: 'Designs of a programme with their latest version',
  method: 'get',
  path: '/programmes/:programmeId/designs',
  access: 'signed-in',
  status: 200,
  params: z.object({ programmeId: idValue('ProgrammeId') }),
  query: null,
  body: null,
  response: list(designSummary),
});
