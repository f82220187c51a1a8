import { createProgramme, getSession, listProgrammes } from '@tipward/contract';
import { useApiMutation } from '../../../lib/api/api-query.ts';

/** The creator becomes lead: the session's roles change as well. */
export const useCreateProgramme = () => useApiMutation(createProgramme, [listProgrammes, getSession]);
