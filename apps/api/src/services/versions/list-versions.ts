import type { VersionSummary } from '@tipward/contract';
import { notFound } from '../../http/app-error.ts';
import { Design } from '../../models/design.ts';
import type { Actor } from '../../policies/actor.ts';
import { canSeeWork } from '../../policies/programmes.ts';
import { presentVersionSummary } from '../../presenters/version.ts';
import { gatherVersions } from './gather-versions.ts';

/** All versions of a programme, newest first; for those who do the work. */
export async function listVersions(actor: Actor, programmeId: string): Promise<{ items: VersionSummary[] }> {
  if (!canSeeWork(actor, { programmeId })) throw notFound('This programme');
  const designs = await Design.findAll({ where: { programmeId }, attributes: ['id'] });
  const parts = await gatherVersions({ designId: designs.map((design) => design.id) });
  return { items: parts.map(presentVersionSummary) };
}
