import type { Review as ReviewView } from '@tipward/contract';
import { notFound } from '../../http/app-error.ts';
import type { Actor } from '../../policies/actor.ts';
import { canSeeWork } from '../../policies/programmes.ts';
import {
  canComment,
  canResolve,
  canWithdraw,
  whyNotDecide,
  type ReviewRecord,
} from '../../policies/reviews.ts';
import { presentReview, type ReviewParts } from '../../presenters/review.ts';
import { gatherReviews } from './gather-reviews.ts';

export const recordOf = (parts: ReviewParts): ReviewRecord => ({
  programmeId: parts.version.programmeId,
  authorId: parts.authorId,
  state: parts.state,
});

/** A review the actor may see. @throws AppError `not-found`, also for one they may not know of */
export async function findReview(actor: Actor, reviewId: string): Promise<ReviewParts> {
  const [parts] = await gatherReviews({ id: reviewId });
  if (parts === undefined || !canSeeWork(actor, { programmeId: parts.version.programmeId }))
    throw notFound('This review');
  return parts;
}

export async function getReview(actor: Actor, reviewId: string): Promise<ReviewView> {
  const parts = await findReview(actor, reviewId);
  const record = recordOf(parts);
  const why = whyNotDecide(actor, record);
  return presentReview(
    parts,
    {
      comment: canComment(actor, record),
      decide: why === null,
      withdraw: canWithdraw(actor, record),
      whyNotDecide: why,
    },
    (comment) => canResolve(actor, record, comment),
  );
}
