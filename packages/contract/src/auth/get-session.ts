import { operation } from '../operation.ts';
import { session } from './session.ts';

export const getSession = operation({
  id: 'auth.get-session',
  summary: 'Who is signed in',
  method: 'get',
  path: '/auth/session',
  access: 'public',
  status: 200,
  params: null,
  query: null,
  body: null,
  response: session,
});
