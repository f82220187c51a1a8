import {
  askForReview,
  getDesign,
  getVersion,
  listDesigns,
  listProgrammes,
  listReviews,
} from '@tipward/contract';
import { useApiMutation } from '../../../lib/api/api-query.ts';

export const useAskForReview = () =>
  useApiMutation(askForReview, [getVersion, getDesign, listDesigns, listReviews, listProgrammes]);
