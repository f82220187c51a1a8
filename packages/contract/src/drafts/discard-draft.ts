import { z } from 'zod';
import { operation } from '../operation.ts';
import { idValue } from '../values/text.ts';

export const discardDraft = operation({
  id: 'drafts.discard-draft',
  summary: 'Discard a draft',
  method: 'delete',
  path: '/drafts/:draftId',
  access: 'signed-in',
  status: 204,
  params: z.object({ draftId: idValue('DraftId') }),
  query: null,
  body: null,
  response: null,
  ifMatch: true,
});
