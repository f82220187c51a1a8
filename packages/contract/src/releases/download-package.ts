import { z } from 'zod';
import { download } from '../operation.ts';
import { idValue } from '../values/text.ts';

export const downloadPackage = download({
  id: 'releases.download-package',
  summary: 'The release package (ZIP)',
  method: 'get',
  path: '/releases/:releaseId/package',
  access: 'signed-in',
  status: 200,
  params: z.object({ releaseId: idValue('ReleaseId') }),
  query: null,
  body: null,
  response: null,
  binary: 'application/zip',
});
