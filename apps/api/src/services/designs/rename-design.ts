import { UniqueConstraintError } from 'sequelize';
import type { Context } from '../../context.ts';
import { inTransaction } from '../../db/in-transaction.ts';
import { conflict } from '../../http/app-error.ts';
import { requireMatch } from '../../http/etag.ts';
import { Design } from '../../models/design.ts';
import type { Actor } from '../../policies/actor.ts';
import { writeAudit } from '../audit/write-audit.ts';
import { findDesign } from './find-design.ts';
import { getDesign, type DesignWithETag } from './get-design.ts';

export const designNameTaken = () => conflict('A design of this programme has this name; choose another.');

/** Renames a design. @throws AppError `stale` with the design as it stands */
export async function renameDesign(
  context: Context,
  actor: Actor,
  designId: string,
  name: string,
  ifMatch: string,
): Promise<DesignWithETag> {
  const seen = await findDesign(actor, designId);
  const before = await getDesign(actor, designId);
  requireMatch(ifMatch, before.etag, before.view);
  try {
    await inTransaction(context, async (transaction) => {
      const [changed] = await Design.update(
        { name, revision: seen.revision + 1, updatedAt: new Date() },
        { where: { id: designId, revision: seen.revision }, transaction },
      );
      if (changed === 0) return;
      await writeAudit(context, transaction, {
        actorId: actor.personId,
        action: 'designs.renamed',
        subjectKind: 'design',
        subjectId: designId,
        programmeId: seen.programmeId,
        detail: { name, nameBefore: seen.name },
      });
    });
  } catch (error) {
    if (error instanceof UniqueConstraintError) throw designNameTaken();
    throw error;
  }
  const after = await getDesign(actor, designId);
  if (after.view.name !== name) requireMatch(ifMatch, after.etag, after.view);
  return after;
}
