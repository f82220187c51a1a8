import { openDraft } from '@tipward/contract';
import { route } from '../../http/route.ts';
import { openDraft as serve } from '../../services/drafts/open-draft.ts';

export const openDraftRoute = route(openDraft, async ({ context, actor, params, body, setETag }) => {
  const { view, etag } = await serve(context, actor, params.designId, body.fromVersionId);
  setETag(etag);
  return view;
});
