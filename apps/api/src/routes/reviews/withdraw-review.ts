import { withdrawReview } from '@tipward/contract';
import { route } from '../../http/route.ts';
import { withdrawReview as serve } from '../../services/reviews/withdraw-review.ts';

export const withdrawReviewRoute = route(withdrawReview, ({ context, actor, params }) =>
  serve(context, actor, params.reviewId),
);
