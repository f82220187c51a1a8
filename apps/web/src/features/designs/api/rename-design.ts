import { getDesign, listDesigns, renameDesign } from '@tipward/contract';
import { useApiMutation } from '../../../lib/api/api-query.ts';

export const useRenameDesign = () => useApiMutation(renameDesign, [getDesign, listDesigns]);
