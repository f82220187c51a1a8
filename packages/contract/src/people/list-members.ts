import { z } from 'zod';
import { operation } from '../operation.ts';
import { idValue } from '../values/text.ts';
import { personRef, role } from './person.ts';
import { list } from '../values/page.ts';

export const listMembers = operation({
  id: 'people.list-members',
  summary: 'Members of a programme',
  method: 'get',
  path: '/programmes/:programmeId/members',
  access: 'signed-in',
  status: 200,
  params: z.object({ programmeId: idValue('ProgrammeId') }),
  query: null,
  body: null,
  response: list(z.object({ person: personRef, email: z.string(), role })),
});
