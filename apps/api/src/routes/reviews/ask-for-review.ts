import { askForReview } from '@tipward/contract';
import { route } from '../../http/route.ts';
import { askForReview as serve } from '../../services/reviews/ask-for-review.ts';

export const askForReviewRoute = route(askForReview, ({ context, actor, params, body }) =>
  serve(context, actor, params.versionId, body.message),
);
