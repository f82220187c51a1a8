import type { Transaction } from 'sequelize';
import { notFound } from '../../http/app-error.ts';
import type { Actor } from '../../policies/actor.ts';
import { canSeeWork } from '../../policies/programmes.ts';
import type { DraftParts } from '../../presenters/draft.ts';
import { gatherDrafts } from './gather-drafts.ts';

/** A draft of the actor's own. @throws AppError `not-found` for anyone else's, whoever asks */
export async function findDraft(
  actor: Actor,
  draftId: string,
  transaction?: Transaction,
): Promise<DraftParts> {
  const [parts] = await gatherDrafts({ id: draftId, authorId: actor.personId }, transaction);
  if (parts === undefined || !canSeeWork(actor, parts)) throw notFound('This draft');
  return parts;
}
