import { getReview } from '@tipward/contract';
import { route } from '../../http/route.ts';
import { getReview as serve } from '../../services/reviews/get-review.ts';

export const getReviewRoute = route(getReview, ({ actor, params }) => serve(actor, params.reviewId));
