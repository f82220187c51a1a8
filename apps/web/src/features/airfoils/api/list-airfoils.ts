import { listAirfoils } from '@tipward/contract';
import { useQuery } from '@tanstack/react-query';
import { apiQuery } from '../../../lib/api/api-query.ts';

export const useAirfoils = () => useQuery(apiQuery(listAirfoils, {}));
