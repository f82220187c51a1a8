import { z } from 'zod';
import { operation } from '../operation.ts';
import { session } from './session.ts';
import { nameText, newPassword } from '../values/text.ts';

export const acceptInvitation = operation({
  id: 'auth.accept-invitation',
  summary: 'Take up an invitation: set name and password and be signed in',
  method: 'post',
  path: '/auth/accept-invitation',
  access: 'public',
  status: 200,
  params: null,
  query: null,
  body: z.strictObject({
    token: z
      .string({ error: 'Link is missing; allowed: the link of the e-mail' })
      .min(20, 'Link is incomplete; allowed: the whole link of the e-mail')
      .max(200, 'Link is too long; allowed: the link of the e-mail'),
    name: nameText('Name'),
    password: newPassword,
  }),
  response: session,
});
