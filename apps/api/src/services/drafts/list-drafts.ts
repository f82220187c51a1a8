import type { DraftSummary } from '@tipward/contract';
import type { Actor } from '../../policies/actor.ts';
import { canSeeWork } from '../../policies/programmes.ts';
import { presentDraftSummary } from '../../presenters/draft.ts';
import { gatherDrafts } from './gather-drafts.ts';

/** The actor's drafts in the programmes they still work on, latest first. */
export async function listDrafts(actor: Actor): Promise<{ items: DraftSummary[] }> {
  const parts = await gatherDrafts({ authorId: actor.personId });
  return { items: parts.filter((part) => canSeeWork(actor, part)).map(presentDraftSummary) };
}
