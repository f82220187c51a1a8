import { z } from 'zod';
import { operation } from '../operation.ts';
import { idValue } from '../values/text.ts';
import { draft } from './draft.ts';

export const getDraft = operation({
  id: 'drafts.get-draft',
  summary: 'One of the caller’s drafts',
  method: 'get',
  path: '/drafts/:draftId',
  access: 'signed-in',
  status: 200,
  params: z.object({ draftId: idValue('DraftId') }),
  query: null,
  body: null,
  response: draft,
});
