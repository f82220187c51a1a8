import { z } from 'zod';
import { operation } from '../operation.ts';
import { comment } from './review.ts';
import { idValue, proseText } from '../values/text.ts';

export const addComment = operation({
  id: 'reviews.add-comment',
  summary: 'Comment on the version or on a station, or reply',
  method: 'post',
  path: '/reviews/:reviewId/comments',
  access: 'signed-in',
  status: 201,
  params: z.object({ reviewId: idValue('ReviewId') }),
  query: null,
  body: z.strictObject({
    text: proseText('Comment', 4000),
    stationRadiusM: z
      .number({ error: 'Station is not a number; allowed: a radius in m, or null' })
      .nullable()
      .default(null),
    replyTo: idValue('Reply').nullable().default(null),
  }),
  response: comment,
  idempotent: true,
});
