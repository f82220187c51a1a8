import { z } from 'zod';
import { operation } from '../operation.ts';
import { emailAddress } from '../values/text.ts';

export const requestPasswordReset = operation({
  id: 'auth.request-password-reset',
  summary: 'Ask for a reset link by e-mail; the answer never tells whether the address is known',
  method: 'post',
  path: '/auth/request-password-reset',
  access: 'public',
  status: 202,
  params: null,
  query: null,
  body: z.strictObject({ email: emailAddress }),
  response: null,
});
