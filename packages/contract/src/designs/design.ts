import { z } from 'zod';
import { personRef } from '../people/person.ts';
import { versionSummary } from '../versions/version.ts';
import { draftSummary } from '../drafts/draft.ts';

export const designSummary = z.object({
  id: z.string(),
  programmeId: z.string(),
  name: z.string(),
  createdBy: personRef,
  createdAt: z.string(),
  updatedAt: z.string(),
  versionCount: z.number(),
  latestVersion: versionSummary.nullable(),
});
export type DesignSummary = z.infer<typeof designSummary>;

export const design = designSummary.extend({
  programmeName: z.string(),
  versions: z.array(versionSummary),
  /** The caller's own drafts of this design. */
  drafts: z.array(draftSummary),
  abilities: z.object({ rename: z.boolean(), openDraft: z.boolean() }),
});
export type Design = z.infer<typeof design>;
