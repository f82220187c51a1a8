import { z } from 'zod';
import { draftContent } from '../designs/content.ts';

export const draftSummary = z.object({
  id: z.string(),
  designId: z.string(),
  designName: z.string(),
  programmeId: z.string(),
  programmeName: z.string(),
  /** Version the draft was opened from. */
  parentVersionId: z.string().nullable(),
  parentLabel: z.string().nullable(),
  updatedAt: z.string(),
  createdAt: z.string(),
});
export type DraftSummary = z.infer<typeof draftSummary>;

/** A private draft. `revision` grows by one with each save and is the ETag ("<revision>"). */
export const draft = draftSummary.extend({ revision: z.number(), content: draftContent });
export type Draft = z.infer<typeof draft>;
