import { z } from 'zod';
import { operation } from '../operation.ts';
import { review } from './review.ts';
import { idValue, optionalProse, sha256 } from '../values/text.ts';

export const decideReview = operation({
  id: 'reviews.decide-review',
  summary: 'Approve or ask for changes; needs the password and the hashes that were seen',
  method: 'post',
  path: '/reviews/:reviewId/decision',
  access: 'signed-in',
  status: 201,
  params: z.object({ reviewId: idValue('ReviewId') }),
  query: null,
  body: z.strictObject({
    outcome: z.enum(['approved', 'changes-requested'], {
      error: 'Outcome is unknown; allowed: approved, changes-requested',
    }),
    note: optionalProse('Note', 2000),
    password: z
      .string({ error: 'Password is missing; allowed: your own' })
      .min(1, 'Password is empty; allowed: your own')
      .max(500, 'Password is too long; allowed: at most 500 characters'),
    contentHash: sha256,
    specificationHash: sha256,
  }),
  response: review,
});
