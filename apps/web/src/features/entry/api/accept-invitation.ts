import { acceptInvitation } from '@tipward/contract';
import type { BodyOf } from '@tipward/contract';
import { callApi } from '../../../lib/api/call-api.ts';
import { useEnterSession } from '../../../lib/session/session-query.ts';

export function useAcceptInvitation() {
  const enter = useEnterSession();
  return async (body: BodyOf<typeof acceptInvitation>) => {
    enter(await callApi(acceptInvitation, { body }));
  };
}
