import { operation } from '../operation.ts';

export const signOutEverywhere = operation({
  id: 'auth.sign-out-everywhere',
  summary: 'End every session of the caller',
  method: 'post',
  path: '/auth/sign-out-everywhere',
  access: 'signed-in',
  status: 204,
  params: null,
  query: null,
  body: null,
  response: null,
});
