import { z } from 'zod';
import { designContent } from '../designs/content.ts';
import { evaluation, keyNumbers, verdict } from '../designs/evaluation.ts';
import { personRef } from '../people/person.ts';

export const VERSION_STATES = [
  'saved',
  'in-review',
  'approved',
  'changes-requested',
  'released',
  'superseded',
  'withdrawn',
] as const;
export const versionState = z.enum(VERSION_STATES);
export type VersionState = z.infer<typeof versionState>;

export const versionSummary = z.object({
  id: z.string(),
  designId: z.string(),
  designName: z.string(),
  programmeId: z.string(),
  number: z.number(),
  /** 'v3' */
  label: z.string(),
  note: z.string(),
  state: versionState,
  parentId: z.string().nullable(),
  parentLabel: z.string().nullable(),
  contentHash: z.string(),
  specificationIssue: z.number(),
  author: personRef,
  savedAt: z.string(),
  keyNumbers,
  verdicts: z.array(verdict),
  reviewId: z.string().nullable(),
  release: z.object({ id: z.string(), letter: z.string() }).nullable(),
});
export type VersionSummary = z.infer<typeof versionSummary>;

export const version = versionSummary.extend({
  programmeName: z.string(),
  content: designContent,
  evaluation,
  /** What changed since the parent, in words and numbers; empty for a first version. */
  changeSummary: z.array(z.string()),
  abilities: z.object({ askForReview: z.boolean(), release: z.boolean(), openDraft: z.boolean() }),
});
export type Version = z.infer<typeof version>;
