import { operation } from '../operation.ts';

export const signOut = operation({
  id: 'auth.sign-out',
  summary: 'End this session',
  method: 'post',
  path: '/auth/sign-out',
  access: 'signed-in',
  status: 204,
  params: null,
  query: null,
  body: null,
  response: null,
});
