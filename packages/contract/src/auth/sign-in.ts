import { z } from 'zod';
import { operation } from '../operation.ts';
import { session } from './session.ts';
import { emailAddress } from '../values/text.ts';

export const signIn = operation({
  id: 'auth.sign-in',
  summary: 'Sign in with e-mail and password',
  method: 'post',
  path: '/auth/sign-in',
  access: 'public',
  status: 200,
  params: null,
  query: null,
  body: z.strictObject({
    email: emailAddress,
    password: z
      .string({ error: 'Password is missing; allowed: text' })
      .min(1, 'Password is empty; allowed: text')
      .max(500, 'Password is too long; allowed: at most 500 characters'),
  }),
  response: session,
});
