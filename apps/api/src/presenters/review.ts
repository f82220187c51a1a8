import type {
  Comment,
  Decision as DecisionView,
  Review as ReviewView,
  ReviewSummary,
  VersionSummary,
} from '@tipward/contract';
import type { Decision } from '../models/decision.ts';
import type { Review } from '../models/review.ts';
import type { ReviewComment } from '../models/review-comment.ts';
import type { PersonRefs } from './person-ref.ts';

export interface ReviewParts {
  readonly review: Review;
  readonly state: ReviewView['state'];
  readonly decision: Decision | null;
  readonly comments: readonly ReviewComment[];
  readonly version: VersionSummary;
  readonly programmeName: string;
  readonly authorId: string;
  readonly specificationHash: string;
  readonly changeSummary: readonly string[];
  /** Radii of the stations of the version, to which comments may be pinned. */
  readonly stationRadiiM: readonly number[];
  readonly ref: PersonRefs;
}

export function presentComment(comment: ReviewComment, ref: PersonRefs, mayResolve: boolean): Comment {
  return {
    id: comment.id,
    author: ref(comment.authorId),
    text: comment.text,
    stationRadiusM: comment.stationRadiusM,
    replyTo: comment.replyTo,
    createdAt: comment.createdAt.toISOString(),
    resolvedAt: comment.resolvedAt?.toISOString() ?? null,
    resolvedBy: comment.resolvedBy === null ? null : ref(comment.resolvedBy),
    abilities: { resolve: mayResolve && comment.replyTo === null && comment.resolvedAt === null },
  };
}

function presentDecision(decision: Decision, ref: PersonRefs): DecisionView {
  return {
    id: decision.id,
    outcome: decision.outcome,
    note: decision.note,
    decidedBy: ref(decision.decidedBy),
    decidedAt: decision.decidedAt.toISOString(),
    contentHash: decision.contentHash,
    specificationHash: decision.specificationHash,
  };
}

export function presentReviewSummary(parts: ReviewParts): ReviewSummary {
  return {
    id: parts.review.id,
    programmeId: parts.version.programmeId,
    programmeName: parts.programmeName,
    version: parts.version,
    state: parts.state,
    message: parts.review.message,
    askedBy: parts.ref(parts.review.askedBy),
    askedAt: parts.review.askedAt.toISOString(),
    openComments: parts.comments.filter((comment) => comment.replyTo === null && comment.resolvedAt === null)
      .length,
  };
}

export function presentReview(
  parts: ReviewParts,
  abilities: ReviewView['abilities'],
  mayResolve: (comment: ReviewComment) => boolean,
): ReviewView {
  return {
    ...presentReviewSummary(parts),
    comments: parts.comments.map((comment) => presentComment(comment, parts.ref, mayResolve(comment))),
    decision: parts.decision === null ? null : presentDecision(parts.decision, parts.ref),
    changeSummary: [...parts.changeSummary],
    contentHash: parts.version.contentHash,
    specificationHash: parts.specificationHash,
    abilities,
  };
}
