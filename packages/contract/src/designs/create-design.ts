import { z } from 'zod';
import { operation } from '../operation.ts';
import { draft } from '../drafts/draft.ts';
import { design } from './design.ts';
import { designStart } from './design-start.ts';
import { idValue, nameText } from '../values/text.ts';

export const createDesign = operation({
  id: 'designs.create-design',
  summary: 'Start a design and open its first draft',
  method: 'post',
  path: '/programmes/:programmeId/designs',
  access: 'signed-in',
  status: 201,
  params: z.object({ programmeId: idValue('ProgrammeId') }),
  query: null,
  body: z.strictObject({ name: nameText('Design name'), start: designStart }),
  response: z.object({ design, draft }),
  idempotent: true,
});
