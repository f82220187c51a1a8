import { listVersions } from '@tipward/contract';
import { useQuery } from '@tanstack/react-query';
import { apiQuery } from '../../../lib/api/api-query.ts';

export const useVersions = (programmeId: string) =>
  useQuery(apiQuery(listVersions, { params: { programmeId } }));
