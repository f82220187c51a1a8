import { z } from 'zod';
import { operation } from '../operation.ts';
import { idValue } from '../values/text.ts';

export const removeMember = operation({
  id: 'people.remove-member',
  summary: 'Take a person out of a programme',
  method: 'delete',
  path: '/programmes/:programmeId/members/:personId',
  access: 'administrator',
  status: 204,
  params: z.object({ programmeId: idValue('ProgrammeId'), personId: idValue('PersonId') }),
  query: null,
  body: null,
  response: null,
});
