import { getProgramme, listProgrammes, updateProgramme } from '@tipward/contract';
import { useApiMutation } from '../../../lib/api/api-query.ts';

export const useUpdateProgramme = () => useApiMutation(updateProgramme, [getProgramme, listProgrammes]);
