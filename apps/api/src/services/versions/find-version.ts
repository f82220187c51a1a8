import type { Transaction } from 'sequelize';
import { notFound } from '../../http/app-error.ts';
import type { Actor } from '../../policies/actor.ts';
import { canSeeWork } from '../../policies/programmes.ts';
import type { VersionParts } from '../../presenters/version.ts';
import { gatherVersions } from './gather-versions.ts';

/** A version the actor may see. @throws AppError `not-found`, also for one they may not know of */
export async function findVersion(
  actor: Actor,
  versionId: string,
  transaction?: Transaction,
): Promise<VersionParts> {
  const [parts] = await gatherVersions({ id: versionId }, transaction);
  if (parts === undefined || !canSeeWork(actor, parts)) throw notFound('This version');
  return parts;
}
