import { z } from 'zod';
import { operation } from '../operation.ts';
import { idValue } from '../values/text.ts';
import { review } from './review.ts';

export const getReview = operation({
  id: 'reviews.get-review',
  summary: 'One review with comments and decision',
  method: 'get',
  path: '/reviews/:reviewId',
  access: 'signed-in',
  status: 200,
  params: z.object({ reviewId: idValue('ReviewId') }),
  query: null,
  body: null,
  response: review,
});
