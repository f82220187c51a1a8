import { z } from 'zod';
import { operation } from '../operation.ts';
import { idValue } from '../values/text.ts';
import { draftContent } from '../designs/content.ts';
import { draft } from './draft.ts';

export const saveDraft = operation({
  id: 'drafts.save-draft',
  summary: 'Save a draft; with a stale ETag the answer is 412 with the draft as it stands',
  method: 'put',
  path: '/drafts/:draftId',
  access: 'signed-in',
  status: 200,
  params: z.object({ draftId: idValue('DraftId') }),
  query: null,
  body: z.strictObject({ content: draftContent }),
  response: draft,
  ifMatch: true,
});
