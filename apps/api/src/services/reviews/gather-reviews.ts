import type { WhereOptions } from 'sequelize';
import { Decision } from '../../models/decision.ts';
import { ReviewComment } from '../../models/review-comment.ts';
import { ReviewWithdrawal } from '../../models/review-withdrawal.ts';
import { Review } from '../../models/review.ts';
import type { ReviewParts } from '../../presenters/review.ts';
import { presentVersionSummary } from '../../presenters/version.ts';
import { loadPersonRefs } from '../people/load-person-refs.ts';
import { gatherVersions } from '../versions/gather-versions.ts';

/** Reviews that fit, newest first, each with its version, comments and decision. */
export async function gatherReviews(where: WhereOptions<Review>): Promise<ReviewParts[]> {
  const reviews = await Review.findAll({ where, order: [['ordinal', 'DESC']] });
  if (reviews.length === 0) return [];
  const ids = reviews.map((review) => review.id);
  const [versions, comments, decisions, withdrawals] = await Promise.all([
    gatherVersions({ id: reviews.map((review) => review.versionId) }),
    ReviewComment.findAll({ where: { reviewId: ids }, order: [['createdAt', 'ASC']] }),
    Decision.findAll({ where: { reviewId: ids } }),
    ReviewWithdrawal.findAll({ where: { reviewId: ids } }),
  ]);
  const ref = await loadPersonRefs([
    ...reviews.map((review) => review.askedBy),
    ...comments.flatMap((comment) => [
      comment.authorId,
      ...(comment.resolvedBy === null ? [] : [comment.resolvedBy]),
    ]),
    ...decisions.map((decision) => decision.decidedBy),
  ]);
  return reviews.map((review) => {
    const parts = versions.find((row) => row.version.id === review.versionId);
    if (parts === undefined) throw new Error(`review ${review.id} has no version on record`);
    const decision = decisions.find((row) => row.reviewId === review.id) ?? null;
    const withdrawn = withdrawals.some((row) => row.reviewId === review.id);
    return {
      review,
      state: withdrawn ? 'withdrawn' : (decision?.outcome ?? 'open'),
      decision,
      comments: comments.filter((comment) => comment.reviewId === review.id),
      version: presentVersionSummary(parts),
      programmeName: parts.programmeName,
      authorId: parts.version.authorId,
      specificationHash: parts.version.specificationHash,
      changeSummary: parts.version.changeSummary,
      stationRadiiM: parts.version.content.stations.map((station) => station.radiusM),
      ref,
    };
  });
}
