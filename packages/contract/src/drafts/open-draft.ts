import { z } from 'zod';
import { operation } from '../operation.ts';
import { idValue } from '../values/text.ts';
import { draft } from './draft.ts';

export const openDraft = operation({
  id: 'drafts.open-draft',
  summary: 'Open a private draft from a version of the design',
  method: 'post',
  path: '/designs/:designId/drafts',
  access: 'signed-in',
  status: 201,
  params: z.object({ designId: idValue('DesignId') }),
  query: null,
  body: z.strictObject({ fromVersionId: idValue('Version') }),
  response: draft,
  idempotent: true,
});
