import { getRelease } from '@tipward/contract';
import { useQuery } from '@tanstack/react-query';
import { apiQuery } from '../../../lib/api/api-query.ts';

/** The current release with its evaluation; nothing is asked while there is none. */
export const useRelease = (releaseId: string | null) =>
  useQuery({
    ...apiQuery(getRelease, { params: { releaseId: releaseId ?? '' } }),
    enabled: releaseId !== null,
  });
