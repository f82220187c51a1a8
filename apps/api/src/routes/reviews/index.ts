import { listReviewsRoute } from './list-reviews.ts';
import { askForReviewRoute } from './ask-for-review.ts';
import { getReviewRoute } from './get-review.ts';
import { addCommentRoute } from './add-comment.ts';
import { resolveCommentRoute } from './resolve-comment.ts';
import { decideReviewRoute } from './decide-review.ts';
import { withdrawReviewRoute } from './withdraw-review.ts';

export const reviewRoutes = [
  listReviewsRoute,
  askForReviewRoute,
  getReviewRoute,
  addCommentRoute,
  resolveCommentRoute,
  decideReviewRoute,
  withdrawReviewRoute,
];
