import type { Release as ReleaseView, ReleaseSummary } from '@tipward/contract';
import { notFound } from '../../http/app-error.ts';
import { Release } from '../../models/release.ts';
import type { Actor } from '../../policies/actor.ts';
import { canSeeProgramme } from '../../policies/programmes.ts';
import { presentRelease, presentReleaseSummary, type ReleaseParts } from '../../presenters/release.ts';
import { gatherReleases } from './gather-releases.ts';

/** A release the actor may see: every member of its programme, and administrators. */
export async function findRelease(actor: Actor, releaseId: string): Promise<ReleaseParts> {
  const row = await Release.findByPk(releaseId, { attributes: ['id', 'programmeId'] });
  if (row === null || !canSeeProgramme(actor, row)) throw notFound('This release');
  const parts = (await gatherReleases(row.programmeId)).find(({ release }) => release.id === releaseId);
  if (parts === undefined) throw notFound('This release');
  return parts;
}

export async function getRelease(actor: Actor, releaseId: string): Promise<ReleaseView> {
  return presentRelease(await findRelease(actor, releaseId));
}

export async function listReleases(actor: Actor, programmeId: string): Promise<{ items: ReleaseSummary[] }> {
  if (!canSeeProgramme(actor, { programmeId })) throw notFound('This programme');
  return { items: (await gatherReleases(programmeId)).map(presentReleaseSummary) };
}
