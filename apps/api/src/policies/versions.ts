import type { VersionState } from '@tipward/contract';
import type { Actor } from './actor.ts';
import { canAuthor, canLead, canSeeWork } from './programmes.ts';

interface VersionRecord {
  readonly programmeId: string;
  readonly authorId: string;
  readonly state: VersionState;
}

const ASKABLE: readonly VersionState[] = ['saved', 'changes-requested', 'withdrawn'];

/** The author puts a version before the leads, while it is neither there nor signed. */
export const canAskForReview = (actor: Actor, version: VersionRecord): boolean =>
  canAuthor(actor, version) && version.authorId === actor.personId && ASKABLE.includes(version.state);

/** A lead releases an approved version of someone else's. */
export const canRelease = (actor: Actor, version: VersionRecord): boolean =>
  canLead(actor, version) && version.authorId !== actor.personId && version.state === 'approved';

export const canOpenDraft = (actor: Actor, version: { readonly programmeId: string }): boolean =>
  canSeeWork(actor, version);
