import { z } from 'zod';
import { operation } from '../operation.ts';
import { idValue } from '../values/text.ts';
import { comment } from './review.ts';

export const resolveComment = operation({
  id: 'reviews.resolve-comment',
  summary: 'Mark a comment as resolved',
  method: 'post',
  path: '/comments/:commentId/resolution',
  access: 'signed-in',
  status: 200,
  params: z.object({ commentId: idValue('CommentId') }),
  query: null,
  body: null,
  response: comment,
});
