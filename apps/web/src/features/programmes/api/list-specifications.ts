import { listSpecifications } from '@tipward/contract';
import { useQuery } from '@tanstack/react-query';
import { apiQuery } from '../../../lib/api/api-query.ts';

export const useSpecifications = (programmeId: string) =>
  useQuery(apiQuery(listSpecifications, { params: { programmeId } }));
