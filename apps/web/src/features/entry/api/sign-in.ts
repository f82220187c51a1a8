import { signIn } from '@tipward/contract';
import type { BodyOf } from '@tipward/contract';
import { callApi } from '../../../lib/api/call-api.ts';
import { useEnterSession } from '../../../lib/session/session-query.ts';

export function useSignIn() {
  const enter = useEnterSession();
  return async (body: BodyOf<typeof signIn>) => {
    enter(await callApi(signIn, { body }));
  };
}
