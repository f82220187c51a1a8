import { z } from 'zod';
import { operation } from '../operation.ts';
import { idValue } from '../values/text.ts';
import { role } from './person.ts';

export const setMember = operation({
  id: 'people.set-member',
  summary: 'Give a person a role in a programme',
  method: 'put',
  path: '/programmes/:programmeId/members/:personId',
  access: 'administrator',
  status: 204,
  params: z.object({ programmeId: idValue('ProgrammeId'), personId: idValue('PersonId') }),
  query: null,
  body: z.strictObject({ role }),
  response: null,
});
