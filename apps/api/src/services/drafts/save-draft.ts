import type { DraftContent } from '@tipward/contract';
import type { Context } from '../../context.ts';
import { inTransaction } from '../../db/in-transaction.ts';
import { requireMatch, revisionETag } from '../../http/etag.ts';
import { Draft } from '../../models/draft.ts';
import type { Actor } from '../../policies/actor.ts';
import { findDraft } from './find-draft.ts';
import { getDraft, withETag, type DraftWithETag } from './get-draft.ts';

/**
 * Saves a draft as it stands in one tab. Of two saves from the same revision exactly one is kept; autosaves are not
 * audited.
 * @throws AppError `stale` with the draft as it stands, so that nothing typed is lost
 */
export async function saveDraft(
  context: Context,
  actor: Actor,
  draftId: string,
  content: DraftContent,
  ifMatch: string,
): Promise<DraftWithETag> {
  const seen = await findDraft(actor, draftId);
  const { etag, view } = withETag(seen);
  requireMatch(ifMatch, etag, view);
  const { revision } = seen.draft;
  const changed = await inTransaction(context, async (transaction) => {
    const [count] = await Draft.update(
      { content, revision: revision + 1, updatedAt: new Date() },
      { where: { id: draftId, revision }, transaction },
    );
    return count;
  });
  const after = await getDraft(actor, draftId);
  if (changed === 0) requireMatch(revisionETag(revision), after.etag, after.view);
  return after;
}
