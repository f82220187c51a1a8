import { z } from 'zod';
import { operation } from '../operation.ts';
import { reviewSummary } from './review.ts';
import { list } from '../values/page.ts';
import { idValue } from '../values/text.ts';

export const listReviews = operation({
  id: 'reviews.list-reviews',
  summary: 'Reviews of the caller’s programmes, open ones first',
  method: 'get',
  path: '/reviews',
  access: 'signed-in',
  status: 200,
  params: null,
  query: z.object({ programmeId: idValue('Programme').optional() }),
  body: null,
  response: list(reviewSummary),
});
