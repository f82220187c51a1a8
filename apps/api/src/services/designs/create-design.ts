import type { DesignStart } from '@tipward/contract';
import { UniqueConstraintError } from 'sequelize';
import type { Context } from '../../context.ts';
import { inTransaction } from '../../db/in-transaction.ts';
import { forbidden, notFound } from '../../http/app-error.ts';
import { Design } from '../../models/design.ts';
import { Draft } from '../../models/draft.ts';
import type { Actor } from '../../policies/actor.ts';
import { canAuthor, canSeeProgramme } from '../../policies/programmes.ts';
import { writeAudit } from '../audit/write-audit.ts';
import { getDraft } from '../drafts/get-draft.ts';
import { getDesign } from './get-design.ts';
import { designNameTaken } from './rename-design.ts';
import { startContent } from './start-content.ts';

interface Given {
  readonly name: string;
  readonly start: DesignStart;
}

/** Starts a design and opens its first draft. */
export async function createDesign(
  context: Context,
  actor: Actor,
  programmeId: string,
  { name, start }: Given,
) {
  if (!canSeeProgramme(actor, { programmeId })) throw notFound('This programme');
  if (!canAuthor(actor, { programmeId }))
    throw forbidden('Only aerodynamicists and leads of the programme start designs.');
  const { content, parentVersionId } = await startContent(actor, programmeId, start);
  try {
    const ids = await inTransaction(context, async (transaction) => {
      const design = await Design.create({ programmeId, name, createdBy: actor.personId }, { transaction });
      const draft = await Draft.create(
        { designId: design.id, authorId: actor.personId, parentVersionId, content },
        { transaction },
      );
      await writeAudit(context, transaction, {
        actorId: actor.personId,
        action: 'designs.created',
        subjectKind: 'design',
        subjectId: design.id,
        programmeId,
        detail: { name, start: start.kind, draftId: draft.id },
      });
      return { designId: design.id, draftId: draft.id };
    });
    const [design, draft] = await Promise.all([getDesign(actor, ids.designId), getDraft(actor, ids.draftId)]);
    return { design: design.view, draft: draft.view };
  } catch (error) {
    if (error instanceof UniqueConstraintError) throw designNameTaken();
    throw error;
  }
}
