import { z } from 'zod';
import { operation } from '../operation.ts';
import { version } from './version.ts';
import { idValue, proseText } from '../values/text.ts';

export const saveVersion = operation({
  id: 'versions.save-version',
  summary: 'Save the draft as the next version; the server evaluates it',
  method: 'post',
  path: '/drafts/:draftId/versions',
  access: 'signed-in',
  status: 201,
  params: z.object({ draftId: idValue('DraftId') }),
  query: null,
  body: z.strictObject({ note: proseText('Note', 500) }),
  response: version,
  ifMatch: true,
  idempotent: true,
});
