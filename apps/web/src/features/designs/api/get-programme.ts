import { getProgramme } from '@tipward/contract';
import { useQuery } from '@tanstack/react-query';
import { apiQuery } from '../../../lib/api/api-query.ts';

export const useProgramme = (programmeId: string) =>
  useQuery(apiQuery(getProgramme, { params: { programmeId } }));
