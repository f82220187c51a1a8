import type { Review as ReviewView } from '@tipward/contract';
import { UniqueConstraintError } from 'sequelize';
import type { Context } from '../../context.ts';
import { inTransaction } from '../../db/in-transaction.ts';
import { queueUp } from '../../db/queue-up.ts';
import { conflict, forbidden } from '../../http/app-error.ts';
import { ReviewWithdrawal } from '../../models/review-withdrawal.ts';
import type { Actor } from '../../policies/actor.ts';
import { canWithdraw } from '../../policies/reviews.ts';
import { writeAudit } from '../audit/write-audit.ts';
import { findReview, getReview, recordOf } from './get-review.ts';

/** Takes a version back out of review before it is decided; its author only. */
export async function withdrawReview(context: Context, actor: Actor, reviewId: string): Promise<ReviewView> {
  const parts = await findReview(actor, reviewId);
  if (parts.state !== 'open') throw conflict('This review is closed already.');
  if (!canWithdraw(actor, recordOf(parts)))
    throw forbidden('Only the author takes a version back out of review.');
  try {
    await inTransaction(context, async (transaction) => {
      await queueUp(context.db, transaction, `version ${parts.version.id}`);
      await ReviewWithdrawal.create({ reviewId, withdrawnBy: actor.personId }, { transaction });
      await writeAudit(context, transaction, {
        actorId: actor.personId,
        action: 'reviews.withdrawn',
        subjectKind: 'review',
        subjectId: reviewId,
        programmeId: parts.version.programmeId,
        detail: { versionId: parts.version.id },
      });
    });
  } catch (error) {
    if (error instanceof UniqueConstraintError) throw conflict('This review is closed already.');
    throw error;
  }
  return getReview(actor, reviewId);
}
