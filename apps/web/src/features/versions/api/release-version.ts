import {
  getDesign,
  getProgramme,
  getVersion,
  listDesigns,
  listProgrammes,
  listReleases,
  releaseVersion,
} from '@tipward/contract';
import { useApiMutation } from '../../../lib/api/api-query.ts';

export const useReleaseVersion = () =>
  useApiMutation(releaseVersion, [
    getVersion,
    getDesign,
    listDesigns,
    listReleases,
    getProgramme,
    listProgrammes,
  ]);
