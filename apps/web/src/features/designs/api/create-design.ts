import { createDesign, listDesigns, listDrafts, listProgrammes } from '@tipward/contract';
import { useApiMutation } from '../../../lib/api/api-query.ts';

export const useCreateDesign = () => useApiMutation(createDesign, [listDesigns, listDrafts, listProgrammes]);
