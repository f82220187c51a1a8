import { z } from 'zod';
import { operation } from '../operation.ts';
import { idValue } from '../values/text.ts';

export const resendInvitation = operation({
  id: 'people.resend-invitation',
  summary: 'Send the invitation again with a new link; the old one ends',
  method: 'post',
  path: '/people/:personId/invitation',
  access: 'administrator',
  status: 204,
  params: z.object({ personId: idValue('PersonId') }),
  query: null,
  body: null,
  response: null,
});
