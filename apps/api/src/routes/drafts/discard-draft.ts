import { discardDraft } from '@tipward/contract';
import { route } from '../../http/route.ts';
import { discardDraft as serve } from '../../services/drafts/discard-draft.ts';

export const discardDraftRoute = route(discardDraft, async ({ context, actor, params, ifMatch }) => {
  await serve(context, actor, params.draftId, ifMatch);
  return undefined;
});
