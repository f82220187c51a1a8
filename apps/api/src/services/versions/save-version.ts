import { SOLVER } from '@tipward/bem-solver';
import type { DesignContent, Evaluation, Version as VersionView } from '@tipward/contract';
import { checkDraft, summariseChange } from '@tipward/design-model';
import type { Transaction } from 'sequelize';
import type { Context } from '../../context.ts';
import { inTransaction } from '../../db/in-transaction.ts';
import { conflict, invalid } from '../../http/app-error.ts';
import { requireMatch } from '../../http/etag.ts';
import { Design } from '../../models/design.ts';
import { Draft } from '../../models/draft.ts';
import { EvaluationRecord } from '../../models/evaluation-record.ts';
import { Version } from '../../models/version.ts';
import type { Actor } from '../../policies/actor.ts';
import { versionLabel, type VersionParts } from '../../presenters/version.ts';
import { writeAudit } from '../audit/write-audit.ts';
import { evaluate } from '../designs/evaluate.ts';
import { loadInputs } from '../designs/load-inputs.ts';
import { findDraft } from '../drafts/find-draft.ts';
import { getDraft, withETag } from '../drafts/get-draft.ts';
import { gatherVersions } from './gather-versions.ts';
import { findVersion } from './find-version.ts';
import { viewVersion } from './get-version.ts';

interface Ready {
  readonly draft: Draft;
  readonly programmeId: string;
  readonly content: DesignContent;
  readonly evaluation: Evaluation;
  readonly parent: VersionParts | null;
  readonly note: string;
}

async function findParent(draft: Draft): Promise<VersionParts | null> {
  if (draft.parentVersionId === null) return null;
  const [parent] = await gatherVersions({ id: draft.parentVersionId });
  return parent ?? null;
}

/** The evaluation of record is kept once for a content, specification and solver. */
async function keepEvaluation(transaction: Transaction, evaluation: Evaluation): Promise<void> {
  const { contentHash, specificationHash } = evaluation;
  await EvaluationRecord.bulkCreate(
    [{ contentHash, specificationHash, solverVersion: SOLVER.version, evaluation }],
    {
      ignoreDuplicates: true,
      transaction,
    },
  );
}

async function write(context: Context, actor: Actor, ready: Ready): Promise<string | null> {
  const { draft, content, evaluation, parent, note } = ready;
  return inTransaction(context, async (transaction) => {
    // The design's row is the queue for version numbers: never a gap, never the same twice.
    await Design.findByPk(draft.designId, { transaction, lock: transaction.LOCK.UPDATE });
    const closed = await Draft.destroy({ where: { id: draft.id, revision: draft.revision }, transaction });
    if (closed === 0) return null;
    await keepEvaluation(transaction, evaluation);
    const last = await Version.max<number | null, Version>('number', {
      where: { designId: draft.designId },
      transaction,
    });
    const number = (last ?? 0) + 1;
    const version = await Version.create(
      {
        designId: draft.designId,
        number,
        parentId: draft.parentVersionId,
        note,
        content,
        contentHash: evaluation.contentHash,
        specificationIssue: content.specificationIssue,
        specificationHash: evaluation.specificationHash,
        solverVersion: SOLVER.version,
        changeSummary:
          parent === null
            ? []
            : summariseChange({
                before: { content: parent.version.content, evaluation: parent.evaluation },
                after: { content, evaluation },
              }),
        authorId: actor.personId,
      },
      { transaction },
    );
    await Design.update({ updatedAt: new Date() }, { where: { id: draft.designId }, transaction });
    await writeAudit(context, transaction, {
      actorId: actor.personId,
      action: 'versions.saved',
      subjectKind: 'version',
      subjectId: version.id,
      programmeId: ready.programmeId,
      detail: {
        designId: draft.designId,
        label: versionLabel(number),
        contentHash: version.contentHash,
        draftId: draft.id,
      },
    });
    return version.id;
  });
}

/**
 * Saves a draft as the next version of its design: checked as a whole, evaluated, pinned and closed, all or nothing.
 * @throws AppError `invalid` with every fault; `conflict` when nothing differs from the parent; `stale` with the draft as
 * it stands when it was edited meanwhile
 */
export async function saveVersion(
  context: Context,
  actor: Actor,
  draftId: string,
  note: string,
  ifMatch: string,
): Promise<VersionView> {
  const seen = await findDraft(actor, draftId);
  const { etag, view } = withETag(seen);
  requireMatch(ifMatch, etag, view);
  const { content, faults } = checkDraft(seen.draft.content);
  if (content === null) throw invalid(faults);
  const evaluation = evaluate(content, await loadInputs(seen.programmeId, content));
  const parent = await findParent(seen.draft);
  if (parent !== null && parent.version.contentHash === evaluation.contentHash)
    throw conflict(
      `Nothing differs from ${versionLabel(parent.version.number)}, the version the draft was opened from.`,
    );
  const id = await write(context, actor, {
    draft: seen.draft,
    programmeId: seen.programmeId,
    content,
    evaluation,
    parent,
    note,
  });
  if (id === null) {
    const after = await getDraft(actor, draftId);
    requireMatch(ifMatch, after.etag, after.view);
    throw conflict('The draft was closed meanwhile.');
  }
  return viewVersion(actor, await findVersion(actor, id));
}
