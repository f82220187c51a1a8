import type { BodyOf, updateProgramme as operation } from '@tipward/contract';
import { UniqueConstraintError } from 'sequelize';
import type { Context } from '../../context.ts';
import { inTransaction } from '../../db/in-transaction.ts';
import { forbidden } from '../../http/app-error.ts';
import { requireMatch } from '../../http/etag.ts';
import { Programme } from '../../models/programme.ts';
import type { Actor } from '../../policies/actor.ts';
import { canLead } from '../../policies/programmes.ts';
import { writeAudit } from '../audit/write-audit.ts';
import { nameTaken } from './create-programme.ts';
import { findProgramme, getProgramme, type ProgrammeWithETag } from './get-programme.ts';

type Given = BodyOf<typeof operation>;

async function write(context: Context, actor: Actor, seen: Programme, given: Given): Promise<boolean> {
  return inTransaction(context, async (transaction) => {
    const [changed] = await Programme.update(
      { name: given.name, summary: given.summary, revision: seen.revision + 1, updatedAt: new Date() },
      { where: { id: seen.id, revision: seen.revision }, transaction },
    );
    if (changed === 0) return false;
    await writeAudit(context, transaction, {
      actorId: actor.personId,
      action: 'programmes.changed',
      subjectKind: 'programme',
      subjectId: seen.id,
      programmeId: seen.id,
      detail: { name: given.name, nameBefore: seen.name },
    });
    return true;
  });
}

/** Renames or describes a programme. @throws AppError `stale` with the programme as it stands */
export async function updateProgramme(
  context: Context,
  actor: Actor,
  programmeId: string,
  given: Given,
  ifMatch: string,
): Promise<ProgrammeWithETag> {
  const seen = await findProgramme(actor, programmeId);
  if (!canLead(actor, { programmeId })) throw forbidden('Only a lead of the programme edits it.');
  const before = await getProgramme(context, actor, programmeId);
  requireMatch(ifMatch, before.etag, before.view);
  try {
    const kept = await write(context, actor, seen, given);
    const after = await getProgramme(context, actor, programmeId);
    if (!kept) requireMatch(ifMatch, after.etag, after.view);
    return after;
  } catch (error) {
    if (error instanceof UniqueConstraintError) throw nameTaken();
    throw error;
  }
}
