import { discardDraft, getDesign, listDrafts, listProgrammes } from '@tipward/contract';
import { useApiMutation } from '../../../lib/api/api-query.ts';

export const useDiscardDraft = () => useApiMutation(discardDraft, [listDrafts, getDesign, listProgrammes]);
