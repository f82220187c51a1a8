import {
  addComment,
  decideReview,
  getDesign,
  getReview,
  getVersion,
  listDesigns,
  listProgrammes,
  listReviews,
  resolveComment,
  withdrawReview,
} from '@tipward/contract';
import { useApiMutation } from '../../../lib/api/api-query.ts';

const STATE_CHANGES = [getReview, listReviews, getVersion, getDesign, listDesigns, listProgrammes];

export const useAddComment = () => useApiMutation(addComment, [getReview, listReviews]);
export const useResolveComment = () => useApiMutation(resolveComment, [getReview, listReviews]);
export const useDecideReview = () => useApiMutation(decideReview, STATE_CHANGES);
export const useWithdrawReview = () => useApiMutation(withdrawReview, STATE_CHANGES);
