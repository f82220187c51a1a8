import { z } from 'zod';
import { operation } from '../operation.ts';
import { idValue } from '../values/text.ts';
import { versionSummary } from './version.ts';
import { list } from '../values/page.ts';

export const listVersions = operation({
  id: 'versions.list-versions',
  summary: 'All versions of a programme, newest first',
  method: 'get',
  path: '/programmes/:programmeId/versions',
  access: 'signed-in',
  status: 200,
  params: z.object({ programmeId: idValue('ProgrammeId') }),
  query: null,
  body: null,
  response: list(versionSummary),
});
