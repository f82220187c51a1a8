import { addComment } from '@tipward/contract';
import { route } from '../../http/route.ts';
import { addComment as serve } from '../../services/reviews/add-comment.ts';

export const addCommentRoute = route(addComment, ({ context, actor, params, body }) =>
  serve(context, actor, params.reviewId, body),
);
