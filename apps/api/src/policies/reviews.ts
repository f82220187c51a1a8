import type { Actor } from './actor.ts';
import { canAuthor, canLead } from './programmes.ts';

export interface ReviewRecord {
  readonly programmeId: string;
  /** Author of the version under review. */
  readonly authorId: string;
  readonly state: 'open' | 'approved' | 'changes-requested' | 'withdrawn';
}

export const canComment = (actor: Actor, review: ReviewRecord): boolean => canAuthor(actor, review);

/** Why this person may not sign, in words; null when they may. Four eyes: never one's own version. */
export function whyNotDecide(actor: Actor, review: ReviewRecord): string | null {
  if (review.state !== 'open') return 'This review is closed.';
  if (!canLead(actor, review)) return 'Only a lead of the programme decides.';
  if (review.authorId === actor.personId) return 'Nobody decides on a version of their own.';
  return null;
}

export const canWithdraw = (actor: Actor, review: ReviewRecord): boolean =>
  review.state === 'open' && review.authorId === actor.personId && canAuthor(actor, review);

/** Whoever wrote the comment, the author of the version, or a lead. */
export const canResolve = (
  actor: Actor,
  review: ReviewRecord,
  comment: { readonly authorId: string },
): boolean =>
  canAuthor(actor, review) &&
  (comment.authorId === actor.personId || review.authorId === actor.personId || canLead(actor, review));
