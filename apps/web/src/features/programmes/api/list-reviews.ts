import { listReviews } from '@tipward/contract';
import { useQuery } from '@tanstack/react-query';
import { apiQuery } from '../../../lib/api/api-query.ts';

/** Reviews of one programme, or of all the caller's programmes. */
export const useReviews = (programmeId?: string) =>
  useQuery(apiQuery(listReviews, programmeId === undefined ? {} : { query: { programmeId } }));
