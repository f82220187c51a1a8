import { z } from 'zod';
import { operation } from '../operation.ts';
import { idValue } from '../values/text.ts';
import { review } from './review.ts';

export const withdrawReview = operation({
  id: 'reviews.withdraw-review',
  summary: 'Take a version back out of review',
  method: 'post',
  path: '/reviews/:reviewId/withdrawal',
  access: 'signed-in',
  status: 200,
  params: z.object({ reviewId: idValue('ReviewId') }),
  query: null,
  body: null,
  response: review,
});
