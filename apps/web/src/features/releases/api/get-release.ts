import { getRelease } from '@tipward/contract';
import { useQuery } from '@tanstack/react-query';
import { apiQuery } from '../../../lib/api/api-query.ts';

export const useRelease = (releaseId: string) => useQuery(apiQuery(getRelease, { params: { releaseId } }));
