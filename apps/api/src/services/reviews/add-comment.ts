import type { BodyOf, Comment, Fault, addComment as operation } from '@tipward/contract';
import type { Context } from '../../context.ts';
import { inTransaction } from '../../db/in-transaction.ts';
import { invalid } from '../../http/app-error.ts';
import { reviewCommentedLetter } from '../../mail/templates/review-commented.ts';
import { ReviewComment } from '../../models/review-comment.ts';
import type { Actor } from '../../policies/actor.ts';
import { canResolve } from '../../policies/reviews.ts';
import { presentComment, type ReviewParts } from '../../presenters/review.ts';
import { writeAudit } from '../audit/write-audit.ts';
import { writeMail } from '../mail/write-mail.ts';
import { loadPersonRefs } from '../people/load-person-refs.ts';
import { addressesOfPeople } from './concerned.ts';
import { findReview, recordOf } from './get-review.ts';

type Given = BodyOf<typeof operation>;

function check(parts: ReviewParts, given: Given): void {
  const faults: Fault[] = [];
  const { stationRadiusM, replyTo } = given;
  if (stationRadiusM !== null && !parts.stationRadiiM.includes(stationRadiusM))
    faults.push({
      field: 'stationRadiusM',
      value: String(stationRadiusM),
      message: 'No station has this radius; allowed: the radius of a station of the version, or null',
    });
  const answered = parts.comments.find((comment) => comment.id === replyTo);
  if (replyTo !== null && (answered === undefined || answered.replyTo !== null))
    faults.push({
      field: 'replyTo',
      value: replyTo,
      message: 'No such comment in this review; allowed: a comment that is not itself a reply',
    });
  if (faults.length > 0) throw invalid(faults);
}

/** Comments on the version or a station of it, or replies. */
export async function addComment(
  context: Context,
  actor: Actor,
  reviewId: string,
  given: Given,
): Promise<Comment> {
  const parts = await findReview(actor, reviewId);
  check(parts, given);
  const answered = parts.comments.find((comment) => comment.id === given.replyTo);
  const concerned = await addressesOfPeople(
    [parts.authorId, ...(answered === undefined ? [] : [answered.authorId])],
    actor.personId,
  );
  const comment = await inTransaction(context, async (transaction) => {
    const created = await ReviewComment.create(
      { reviewId, authorId: actor.personId, ...given },
      { transaction },
    );
    const letter = reviewCommentedLetter({
      programmeName: parts.programmeName,
      designName: parts.version.designName,
      versionLabel: parts.version.label,
      writtenBy: actor.name,
      stationRadiusM: given.stationRadiusM ?? answered?.stationRadiusM ?? null,
      text: given.text,
      link: `${context.config.publicUrl}/reviews/${reviewId}`,
    });
    await writeMail(transaction, concerned, letter);
    await writeAudit(context, transaction, {
      actorId: actor.personId,
      action: 'comments.added',
      subjectKind: 'comment',
      subjectId: created.id,
      programmeId: parts.version.programmeId,
      detail: { reviewId, stationRadiusM: given.stationRadiusM, replyTo: given.replyTo },
    });
    return created;
  });
  return presentComment(
    comment,
    await loadPersonRefs([actor.personId]),
    canResolve(actor, recordOf(parts), comment),
  );
}
