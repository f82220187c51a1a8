import { toDraft } from '@tipward/design-model';
import type { Context } from '../../context.ts';
import { inTransaction } from '../../db/in-transaction.ts';
import { invalid } from '../../http/app-error.ts';
import { Draft } from '../../models/draft.ts';
import type { Actor } from '../../policies/actor.ts';
import { writeAudit } from '../audit/write-audit.ts';
import { findDesign } from '../designs/find-design.ts';
import { findVersion } from '../versions/find-version.ts';
import { getDraft, type DraftWithETag } from './get-draft.ts';

/** Opens a private draft from a version of the design. */
export async function openDraft(
  context: Context,
  actor: Actor,
  designId: string,
  fromVersionId: string,
): Promise<DraftWithETag> {
  const design = await findDesign(actor, designId);
  const { version } = await findVersion(actor, fromVersionId);
  if (version.designId !== designId)
    throw invalid([
      {
        field: 'fromVersionId',
        value: fromVersionId,
        message: 'Version is of another design; allowed: a version of this design',
      },
    ]);
  const id = await inTransaction(context, async (transaction) => {
    const draft = await Draft.create(
      { designId, authorId: actor.personId, parentVersionId: version.id, content: toDraft(version.content) },
      { transaction },
    );
    await writeAudit(context, transaction, {
      actorId: actor.personId,
      action: 'drafts.opened',
      subjectKind: 'draft',
      subjectId: draft.id,
      programmeId: design.programmeId,
      detail: { designId, fromVersionId },
    });
    return draft.id;
  });
  return getDraft(actor, id);
}
