import { listReviews } from '@tipward/contract';
import { route } from '../../http/route.ts';
import { listReviews as serve } from '../../services/reviews/list-reviews.ts';

export const listReviewsRoute = route(listReviews, ({ actor, query }) => serve(actor, query.programmeId));
