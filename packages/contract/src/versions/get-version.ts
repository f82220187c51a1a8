import { z } from 'zod';
import { operation } from '../operation.ts';
import { idValue } from '../values/text.ts';
import { version } from './version.ts';

export const getVersion = operation({
  id: 'versions.get-version',
  summary: 'One version with content and evaluation',
  method: 'get',
  path: '/versions/:versionId',
  access: 'signed-in',
  status: 200,
  params: z.object({ versionId: idValue('VersionId') }),
  query: null,
  body: null,
  response: version,
});
