import { z } from 'zod';
import { operation } from '../operation.ts';
import { newPassword } from '../values/text.ts';

export const resetPassword = operation({
  id: 'auth.reset-password',
  summary: 'Set a new password with the link of the e-mail',
  method: 'post',
  path: '/auth/reset-password',
  access: 'public',
  status: 204,
  params: null,
  query: null,
  body: z.strictObject({
    token: z
      .string({ error: 'Link is missing; allowed: the link of the e-mail' })
      .min(20, 'Link is incomplete; allowed: the whole link of the e-mail')
      .max(200, 'Link is too long; allowed: the link of the e-mail'),
    password: newPassword,
  }),
  response: null,
});
