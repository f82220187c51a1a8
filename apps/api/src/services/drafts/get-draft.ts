import type { Draft as DraftView } from '@tipward/contract';
import { revisionETag } from '../../http/etag.ts';
import type { Actor } from '../../policies/actor.ts';
import { presentDraft, type DraftParts } from '../../presenters/draft.ts';
import { findDraft } from './find-draft.ts';

export interface DraftWithETag {
  readonly view: DraftView;
  readonly etag: string;
}

export const withETag = (parts: DraftParts): DraftWithETag => ({
  view: presentDraft(parts),
  etag: revisionETag(parts.draft.revision),
});

export async function getDraft(actor: Actor, draftId: string): Promise<DraftWithETag> {
  return withETag(await findDraft(actor, draftId));
}
