import { getSession } from '@tipward/contract';
import type { Session } from '@tipward/contract';
import { useQuery, useQueryClient } from '@tanstack/react-query';
import { apiQuery } from '../api/api-query.ts';

export const sessionQuery = { ...apiQuery(getSession, {}), staleTime: 60_000 };

/** Who is signed in; undefined data while it is being asked. */
export const useSession = () => useQuery(sessionQuery);

/** Puts a session just opened or ended in place, and forgets everything that was read for another person. */
export function useEnterSession() {
  const client = useQueryClient();
  return (session: Session) => {
    client.removeQueries({ predicate: (query) => query.queryKey[0] !== getSession.id });
    client.setQueryData(sessionQuery.queryKey, session);
  };
}
