import type { Comment } from '@tipward/contract';
import type { Context } from '../../context.ts';
import { inTransaction } from '../../db/in-transaction.ts';
import { conflict, forbidden, notFound } from '../../http/app-error.ts';
import { ReviewComment } from '../../models/review-comment.ts';
import type { Actor } from '../../policies/actor.ts';
import { canSeeWork } from '../../policies/programmes.ts';
import { canResolve } from '../../policies/reviews.ts';
import { presentComment } from '../../presenters/review.ts';
import { writeAudit } from '../audit/write-audit.ts';
import { loadPersonRefs } from '../people/load-person-refs.ts';
import { gatherReviews } from './gather-reviews.ts';
import { recordOf } from './get-review.ts';

/** Marks a comment as resolved, once. */
export async function resolveComment(context: Context, actor: Actor, commentId: string): Promise<Comment> {
  const comment = await ReviewComment.findByPk(commentId);
  const [parts] = comment === null ? [] : await gatherReviews({ id: comment.reviewId });
  if (
    comment === null ||
    parts === undefined ||
    !canSeeWork(actor, { programmeId: parts.version.programmeId })
  )
    throw notFound('This comment');
  if (!canResolve(actor, recordOf(parts), comment))
    throw forbidden('A comment is resolved by who wrote it, by the author of the version or by a lead.');
  if (comment.replyTo !== null) throw conflict('A reply is resolved with the comment it answers.');
  await inTransaction(context, async (transaction) => {
    const [changed] = await ReviewComment.update(
      { resolvedAt: new Date(), resolvedBy: actor.personId },
      { where: { id: commentId, resolvedAt: null }, transaction },
    );
    if (changed === 0) throw conflict('This comment is resolved already.');
    await writeAudit(context, transaction, {
      actorId: actor.personId,
      action: 'comments.resolved',
      subjectKind: 'comment',
      subjectId: commentId,
      programmeId: parts.version.programmeId,
      detail: { reviewId: comment.reviewId },
    });
  });
  await comment.reload();
  return presentComment(comment, await loadPersonRefs([comment.authorId, actor.personId]), false);
}
