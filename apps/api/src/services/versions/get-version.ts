import type { Version as VersionView } from '@tipward/contract';
import type { Actor } from '../../policies/actor.ts';
import { canAskForReview, canOpenDraft, canRelease } from '../../policies/versions.ts';
import { presentVersion, type VersionParts } from '../../presenters/version.ts';
import { findVersion } from './find-version.ts';

export function viewVersion(actor: Actor, parts: VersionParts): VersionView {
  const record = {
    programmeId: parts.programmeId,
    authorId: parts.version.authorId,
    state: parts.state.state,
  };
  return presentVersion(parts, {
    askForReview: canAskForReview(actor, record),
    release: canRelease(actor, record),
    openDraft: canOpenDraft(actor, record),
  });
}

export async function getVersion(actor: Actor, versionId: string): Promise<VersionView> {
  return viewVersion(actor, await findVersion(actor, versionId));
}
