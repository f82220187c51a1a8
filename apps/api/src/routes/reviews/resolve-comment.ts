import { resolveComment } from '@tipward/contract';
import { route } from '../../http/route.ts';
import { resolveComment as serve } from '../../services/reviews/resolve-comment.ts';

export const resolveCommentRoute = route(resolveComment, ({ context, actor, params }) =>
  serve(context, actor, params.commentId),
);
