import type { ReviewSummary } from '@tipward/contract';
import { notFound } from '../../http/app-error.ts';
import { VersionState } from '../../models/version-state.ts';
import type { Actor } from '../../policies/actor.ts';
import { canSeeWork } from '../../policies/programmes.ts';
import { presentReviewSummary } from '../../presenters/review.ts';
import { gatherReviews } from './gather-reviews.ts';

/** Reviews of one or of all programmes the actor works on, open ones first, then newest first. */
export async function listReviews(
  actor: Actor,
  programmeId: string | undefined,
): Promise<{ items: ReviewSummary[] }> {
  if (programmeId !== undefined && !canSeeWork(actor, { programmeId })) throw notFound('This programme');
  const programmeIds =
    programmeId === undefined
      ? [...actor.roles.keys()].filter((id) => canSeeWork(actor, { programmeId: id }))
      : [programmeId];
  const states = await VersionState.findAll({
    where: { programmeId: programmeIds },
    attributes: ['versionId'],
  });
  const parts = await gatherReviews({ versionId: states.map((state) => state.versionId) });
  const open = (state: string) => (state === 'open' ? 0 : 1);
  return { items: parts.sort((a, b) => open(a.state) - open(b.state)).map(presentReviewSummary) };
}
