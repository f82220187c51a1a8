import { listMembers } from '@tipward/contract';
import { useQuery } from '@tanstack/react-query';
import { apiQuery } from '../../../lib/api/api-query.ts';

export const useMembers = (programmeId: string) =>
  useQuery(apiQuery(listMembers, { params: { programmeId } }));
