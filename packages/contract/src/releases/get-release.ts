import { z } from 'zod';
import { operation } from '../operation.ts';
import { idValue } from '../values/text.ts';
import { release } from './release.ts';

export const getRelease = operation({
  id: 'releases.get-release',
  summary: 'One release',
  method: 'get',
  path: '/releases/:releaseId',
  access: 'signed-in',
  status: 200,
  params: z.object({ releaseId: idValue('ReleaseId') }),
  query: null,
  body: null,
  response: release,
});
