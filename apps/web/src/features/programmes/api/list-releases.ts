import { listReleases } from '@tipward/contract';
import { useQuery } from '@tanstack/react-query';
import { apiQuery } from '../../../lib/api/api-query.ts';

export const useReleases = (programmeId: string) =>
  useQuery(apiQuery(listReleases, { params: { programmeId } }));
