import { z } from 'zod';
import { operation } from '../operation.ts';
import { release } from './release.ts';
import { idValue, nameText, optionalProse } from '../values/text.ts';

export const releaseVersion = operation({
  id: 'releases.release-version',
  summary: 'Release an approved version with the next letter; supersedes the earlier release',
  method: 'post',
  path: '/versions/:versionId/release',
  access: 'signed-in',
  status: 201,
  params: z.object({ versionId: idValue('VersionId') }),
  query: null,
  body: z.strictObject({
    effectivity: nameText('Effectivity', 300),
    note: optionalProse('Note', 2000),
    password: z
      .string({ error: 'Password is missing; allowed: your own' })
      .min(1, 'Password is empty; allowed: your own')
      .max(500, 'Password is too long; allowed: at most 500 characters'),
  }),
  response: release,
  idempotent: true,
});
