import { z } from 'zod';
import { designContent } from '../designs/content.ts';
import { evaluation } from '../designs/evaluation.ts';
import { personRef } from '../people/person.ts';

export const releaseSummary = z.object({
  id: z.string(),
  programmeId: z.string(),
  programmeName: z.string(),
  letter: z.string(),
  designId: z.string(),
  designName: z.string(),
  versionId: z.string(),
  versionLabel: z.string(),
  state: z.enum(['released', 'superseded']),
  effectivity: z.string(),
  note: z.string(),
  contentHash: z.string(),
  packageSha256: z.string(),
  packageBytes: z.number(),
  releasedBy: personRef,
  releasedAt: z.string(),
  supersededBy: z.object({ id: z.string(), letter: z.string() }).nullable(),
});
export type ReleaseSummary = z.infer<typeof releaseSummary>;

export const manifestEntry = z.object({ file: z.string(), bytes: z.number(), sha256: z.string() });

/** All a reader may see of a release: the frozen content and its evaluation, not the work behind it. */
export const release = releaseSummary.extend({
  content: designContent,
  evaluation,
  approvedBy: personRef,
  approvedAt: z.string(),
  manifest: z.array(manifestEntry),
});
export type Release = z.infer<typeof release>;
