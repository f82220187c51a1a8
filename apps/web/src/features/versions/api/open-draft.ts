import { getDesign, listDrafts, openDraft } from '@tipward/contract';
import { useApiMutation } from '../../../lib/api/api-query.ts';

export const useOpenDraft = () => useApiMutation(openDraft, [getDesign, listDrafts]);
