import { operation } from '../operation.ts';
import { session } from './session.ts';

export const refreshSession = operation({
  id: 'auth.refresh-session',
  summary: 'Exchange the refresh cookie for a new pair; a used one ends the whole family',
  method: 'post',
  path: '/auth/refresh',
  access: 'public',
  status: 200,
  params: null,
  query: null,
  body: null,
  response: session,
});
