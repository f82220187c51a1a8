import {
  getDesign,
  getProgramme,
  listDesigns,
  listDrafts,
  listProgrammes,
  listVersions,
  saveVersion,
} from '@tipward/contract';
import { useApiMutation } from '../../../lib/api/api-query.ts';

export const useSaveVersion = () =>
  useApiMutation(saveVersion, [
    listVersions,
    listDrafts,
    getDesign,
    listDesigns,
    getProgramme,
    listProgrammes,
  ]);
