import { listDrafts } from '@tipward/contract';
import { useQuery } from '@tanstack/react-query';
import { apiQuery } from '../../../lib/api/api-query.ts';

export const useDrafts = () => useQuery(apiQuery(listDrafts, {}));
