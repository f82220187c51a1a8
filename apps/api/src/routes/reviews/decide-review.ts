import { decideReview } from '@tipward/contract';
import { route } from '../../http/route.ts';
import { decideReview as serve } from '../../services/reviews/decide-review.ts';

export const decideReviewRoute = route(decideReview, ({ context, actor, params, body }) =>
  serve(context, actor, params.reviewId, body),
);
