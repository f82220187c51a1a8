import { z } from 'zod';
import { operation } from '../operation.ts';
import { review } from './review.ts';
import { idValue, optionalProse } from '../values/text.ts';

export const askForReview = operation({
  id: 'reviews.ask-for-review',
  summary: 'Ask the leads for review',
  method: 'post',
  path: '/versions/:versionId/reviews',
  access: 'signed-in',
  status: 201,
  params: z.object({ versionId: idValue('VersionId') }),
  query: null,
  body: z.strictObject({ message: optionalProse('Message', 2000) }),
  response: review,
  idempotent: true,
});
