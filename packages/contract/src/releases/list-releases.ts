import { z } from 'zod';
import { operation } from '../operation.ts';
import { idValue } from '../values/text.ts';
import { releaseSummary } from './release.ts';
import { list } from '../values/page.ts';

export const listReleases = operation({
  id: 'releases.list-releases',
  summary: 'Releases of a programme, newest first',
  method: 'get',
  path: '/programmes/:programmeId/releases',
  access: 'signed-in',
  status: 200,
  params: z.object({ programmeId: idValue('ProgrammeId') }),
  query: null,
  body: null,
  response: list(releaseSummary),
});
