import type { Context } from '../../context.ts';
import { inTransaction } from '../../db/in-transaction.ts';
import { requireMatch } from '../../http/etag.ts';
import { Draft } from '../../models/draft.ts';
import type { Actor } from '../../policies/actor.ts';
import { writeAudit } from '../audit/write-audit.ts';
import { findDraft } from './find-draft.ts';
import { getDraft, withETag } from './get-draft.ts';

/** Throws a draft away. @throws AppError `stale` when it was edited since the actor saw it */
export async function discardDraft(
  context: Context,
  actor: Actor,
  draftId: string,
  ifMatch: string,
): Promise<void> {
  const seen = await findDraft(actor, draftId);
  requireMatch(ifMatch, withETag(seen).etag, withETag(seen).view);
  const gone = await inTransaction(context, async (transaction) => {
    const count = await Draft.destroy({ where: { id: draftId, revision: seen.draft.revision }, transaction });
    if (count === 0) return false;
    await writeAudit(context, transaction, {
      actorId: actor.personId,
      action: 'drafts.discarded',
      subjectKind: 'draft',
      subjectId: draftId,
      programmeId: seen.programmeId,
      detail: { designId: seen.draft.designId },
    });
    return true;
  });
  if (gone) return;
  const after = await getDraft(actor, draftId);
  requireMatch(ifMatch, after.etag, after.view);
}
