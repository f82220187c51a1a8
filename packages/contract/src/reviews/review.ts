import { z } from 'zod';
import { personRef } from '../people/person.ts';
import { versionSummary } from '../versions/version.ts';

export const comment = z.object({
  id: z.string(),
  author: personRef,
  text: z.string(),
  /** Radius of the station it is pinned to, null for the version as a whole. */
  stationRadiusM: z.number().nullable(),
  replyTo: z.string().nullable(),
  createdAt: z.string(),
  resolvedAt: z.string().nullable(),
  resolvedBy: personRef.nullable(),
  abilities: z.object({ resolve: z.boolean() }),
});
export type Comment = z.infer<typeof comment>;

export const decision = z.object({
  id: z.string(),
  outcome: z.enum(['approved', 'changes-requested']),
  note: z.string(),
  decidedBy: personRef,
  decidedAt: z.string(),
  /** Hashes of exactly what was on the screen when it was signed. */
  contentHash: z.string(),
  specificationHash: z.string(),
});
export type Decision = z.infer<typeof decision>;

export const reviewSummary = z.object({
  id: z.string(),
  programmeId: z.string(),
  programmeName: z.string(),
  version: versionSummary,
  state: z.enum(['open', 'approved', 'changes-requested', 'withdrawn']),
  message: z.string(),
  askedBy: personRef,
  askedAt: z.string(),
  openComments: z.number(),
});
export type ReviewSummary = z.infer<typeof reviewSummary>;

export const review = reviewSummary.extend({
  comments: z.array(comment),
  decision: decision.nullable(),
  changeSummary: z.array(z.string()),
  contentHash: z.string(),
  specificationHash: z.string(),
  abilities: z.object({
    comment: z.boolean(),
    decide: z.boolean(),
    withdraw: z.boolean(),
    whyNotDecide: z.string().nullable(),
  }),
});
export type Review = z.infer<typeof review>;
