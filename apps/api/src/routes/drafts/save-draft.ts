import { saveDraft } from '@tipward/contract';
import { route } from '../../http/route.ts';
import { saveDraft as serve } from '../../services/drafts/save-draft.ts';

export const saveDraftRoute = route(saveDraft, async ({ context, actor, params, body, ifMatch, setETag }) => {
  const { view, etag } = await serve(context, actor, params.draftId, body.content, ifMatch);
  setETag(etag);
  return view;
});
