import type { Programme as ProgrammeView } from '@tipward/contract';
import type { Context } from '../../context.ts';
import { notFound } from '../../http/app-error.ts';
import { revisionETag } from '../../http/etag.ts';
import { Programme } from '../../models/programme.ts';
import type { Actor } from '../../policies/actor.ts';
import { canSeeProgramme } from '../../policies/programmes.ts';
import { presentProgramme } from '../../presenters/programme.ts';
import { loadPersonRefs } from '../people/load-person-refs.ts';
import { gatherProgrammes } from './gather-programmes.ts';

export interface ProgrammeWithETag {
  readonly view: ProgrammeView;
  readonly etag: string;
}

/** @throws AppError `not-found`, also for a programme the actor may not know of */
export async function findProgramme(actor: Actor, programmeId: string): Promise<Programme> {
  const programme = canSeeProgramme(actor, { programmeId }) ? await Programme.findByPk(programmeId) : null;
  if (programme === null) throw notFound('This programme');
  return programme;
}

export async function getProgramme(
  context: Context,
  actor: Actor,
  programmeId: string,
): Promise<ProgrammeWithETag> {
  const programme = await findProgramme(actor, programmeId);
  const [parts] = await gatherProgrammes(context, actor, [programme]);
  if (parts === undefined) throw notFound('This programme');
  const ref = await loadPersonRefs([programme.createdBy, parts.latest.issuedBy]);
  return { view: presentProgramme(actor, parts, ref), etag: revisionETag(programme.revision) };
}
