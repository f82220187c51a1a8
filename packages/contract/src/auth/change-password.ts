import { z } from 'zod';
import { operation } from '../operation.ts';
import { newPassword } from '../values/text.ts';

export const changePassword = operation({
  id: 'auth.change-password',
  summary: 'Change the caller’s password; ends all other sessions',
  method: 'post',
  path: '/auth/change-password',
  access: 'signed-in',
  status: 204,
  params: null,
  query: null,
  body: z.strictObject({
    currentPassword: z
      .string({ error: 'Current password is missing; allowed: text' })
      .min(1, 'Current password is empty; allowed: text')
      .max(500, 'Current password is too long; allowed: at most 500 characters'),
    newPassword,
  }),
  response: null,
});
