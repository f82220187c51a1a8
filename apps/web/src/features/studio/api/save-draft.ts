import { saveDraft } from '@tipward/contract';
import type { DraftContent } from '@tipward/contract';
import { callApiTagged } from '../../../lib/api/call-api.ts';

/** Stores a draft on the revision it was edited on. @throws ApiProblem 412 with the stored draft when someone was faster */
export async function storeDraft(
  draftId: string,
  content: DraftContent,
  etag: string,
): Promise<{ etag: string }> {
  const { body, etag: stored } = await callApiTagged(saveDraft, {
    params: { draftId },
    body: { content },
    ifMatch: etag,
  });
  return { etag: stored ?? `"${body.revision}"` };
}
