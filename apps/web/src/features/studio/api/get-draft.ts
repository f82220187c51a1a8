import { getDraft } from '@tipward/contract';
import { useQuery } from '@tanstack/react-query';
import { apiQuery } from '../../../lib/api/api-query.ts';

/** The draft as stored when the studio opens. Never read again behind the person's back: the edits in hand would be overtaken. */
export function useDraft(draftId: string) {
  return useQuery({
    ...apiQuery(getDraft, { params: { draftId } }),
    staleTime: Infinity,
    gcTime: 0,
    refetchOnMount: 'always',
    refetchOnWindowFocus: false,
    refetchOnReconnect: false,
  });
}
