import type { BodyOf, Review as ReviewView, decideReview as operation } from '@tipward/contract';
import { UniqueConstraintError } from 'sequelize';
import type { Context } from '../../context.ts';
import { inTransaction } from '../../db/in-transaction.ts';
import { queueUp } from '../../db/queue-up.ts';
import { conflict, forbidden } from '../../http/app-error.ts';
import { reviewDecidedLetter } from '../../mail/templates/review-decided.ts';
import { Decision } from '../../models/decision.ts';
import type { Actor } from '../../policies/actor.ts';
import { whyNotDecide } from '../../policies/reviews.ts';
import type { ReviewParts } from '../../presenters/review.ts';
import { writeAudit } from '../audit/write-audit.ts';
import { confirmPassword } from '../auth/confirm-password.ts';
import { writeMail } from '../mail/write-mail.ts';
import { addressesOfPeople } from './concerned.ts';
import { findReview, getReview, recordOf } from './get-review.ts';

type Given = BodyOf<typeof operation>;

const DECIDED = 'This review is closed: someone decided or withdrew it in the meantime.';

function check(actor: Actor, parts: ReviewParts, given: Given): void {
  if (parts.state !== 'open') throw conflict(DECIDED);
  const why = whyNotDecide(actor, recordOf(parts));
  if (why !== null) throw forbidden(why);
  if (given.contentHash !== parts.version.contentHash || given.specificationHash !== parts.specificationHash)
    throw conflict(
      'What was on the screen is not what is under review: the hashes differ. Load the page again and read it once more.',
    );
}

async function write(
  context: Context,
  actor: Actor,
  parts: ReviewParts,
  given: Given,
  concerned: readonly string[],
): Promise<void> {
  const { outcome, note, contentHash, specificationHash } = given;
  await inTransaction(context, async (transaction) => {
    await queueUp(context.db, transaction, `version ${parts.version.id}`);
    const decision = await Decision.create(
      {
        reviewId: parts.review.id,
        versionId: parts.version.id,
        outcome,
        note,
        contentHash,
        specificationHash,
        decidedBy: actor.personId,
      },
      { transaction },
    );
    const letter = reviewDecidedLetter({
      programmeName: parts.programmeName,
      designName: parts.version.designName,
      versionLabel: parts.version.label,
      decidedBy: actor.name,
      outcome,
      note,
      link: `${context.config.publicUrl}/reviews/${parts.review.id}`,
    });
    await writeMail(transaction, concerned, letter);
    await writeAudit(context, transaction, {
      actorId: actor.personId,
      action: outcome === 'approved' ? 'reviews.approved' : 'reviews.sent-back',
      subjectKind: 'review',
      subjectId: parts.review.id,
      programmeId: parts.version.programmeId,
      detail: { decisionId: decision.id, versionId: parts.version.id, contentHash, specificationHash },
    });
  });
}

/**
 * Signs a review: the lead's password again, and the hashes of what was on the screen. Of two leads who decide at once
 * one is told that it is closed.
 */
export async function decideReview(
  context: Context,
  actor: Actor,
  reviewId: string,
  given: Given,
): Promise<ReviewView> {
  const parts = await findReview(actor, reviewId);
  check(actor, parts, given);
  await confirmPassword(context, actor, given.password);
  const concerned = await addressesOfPeople([parts.authorId, parts.review.askedBy], actor.personId);
  try {
    await write(context, actor, parts, given, concerned);
  } catch (error) {
    if (error instanceof UniqueConstraintError) throw conflict(DECIDED);
    throw error;
  }
  return getReview(actor, reviewId);
}
