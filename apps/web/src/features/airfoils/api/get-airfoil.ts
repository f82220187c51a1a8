import { getAirfoil } from '@tipward/contract';
import { useQuery } from '@tanstack/react-query';
import { apiQuery } from '../../../lib/api/api-query.ts';

/** An airfoil never changes: read once. */
export const useAirfoil = (airfoilId: string) =>
  useQuery({ ...apiQuery(getAirfoil, { params: { airfoilId } }), staleTime: Infinity });
