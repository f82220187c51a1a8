import { addAirfoil, listAirfoils } from '@tipward/contract';
import { useApiMutation } from '../../../lib/api/api-query.ts';

export const useAddAirfoil = () => useApiMutation(addAirfoil, [listAirfoils]);
