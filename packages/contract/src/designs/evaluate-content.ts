import { z } from 'zod';
import { operation } from '../operation.ts';
import { idValue } from '../values/text.ts';
import { designContent } from './content.ts';
import { evaluation } from './evaluation.ts';

export const evaluateContent = operation({
  id: 'designs.evaluate-content',
  summary: 'Evaluate a design without saving it',
  method: 'post',
  path: '/programmes/:programmeId/evaluations',
  access: 'signed-in',
  status: 200,
  params: z.object({ programmeId: idValue('ProgrammeId') }),
  query: null,
  body: z.strictObject({ content: designContent }),
  response: evaluation,
});
