import type { Review as ReviewView } from '@tipward/contract';
import type { Context } from '../../context.ts';
import { inTransaction } from '../../db/in-transaction.ts';
import { queueUp } from '../../db/queue-up.ts';
import { conflict, forbidden } from '../../http/app-error.ts';
import { reviewAskedLetter } from '../../mail/templates/review-asked.ts';
import { Review } from '../../models/review.ts';
import type { Actor } from '../../policies/actor.ts';
import { canAskForReview } from '../../policies/versions.ts';
import { versionLabel } from '../../presenters/version.ts';
import { writeAudit } from '../audit/write-audit.ts';
import { writeMail } from '../mail/write-mail.ts';
import { findVersion } from '../versions/find-version.ts';
import { addressesOf } from './concerned.ts';
import { getReview } from './get-review.ts';

/** Puts a version before the leads of its programme. @throws AppError `conflict` when it is there already or signed */
export async function askForReview(
  context: Context,
  actor: Actor,
  versionId: string,
  message: string,
): Promise<ReviewView> {
  const seen = await findVersion(actor, versionId);
  if (seen.version.authorId !== actor.personId)
    throw forbidden('Only the author of a version asks for its review.');
  const leads = await addressesOf(seen.programmeId, ['lead'], actor.personId);
  const reviewId = await inTransaction(context, async (transaction) => {
    // Two requests at once cannot both open a review.
    await queueUp(context.db, transaction, `version ${versionId}`);
    const { state } = (await findVersion(actor, versionId, transaction)).state;
    if (!canAskForReview(actor, { programmeId: seen.programmeId, authorId: seen.version.authorId, state }))
      throw conflict(
        `This version is ${state.replace('-', ' ')}; review can be asked for while it is saved, withdrawn or sent back.`,
      );
    const review = await Review.create({ versionId, message, askedBy: actor.personId }, { transaction });
    const letter = reviewAskedLetter({
      programmeName: seen.programmeName,
      designName: seen.designName,
      versionLabel: versionLabel(seen.version.number),
      askedBy: actor.name,
      message,
      link: `${context.config.publicUrl}/reviews/${review.id}`,
    });
    await writeMail(transaction, leads, letter);
    await writeAudit(context, transaction, {
      actorId: actor.personId,
      action: 'reviews.asked',
      subjectKind: 'review',
      subjectId: review.id,
      programmeId: seen.programmeId,
      detail: { versionId, label: versionLabel(seen.version.number), contentHash: seen.version.contentHash },
    });
    return review.id;
  });
  return getReview(actor, reviewId);
}
