import { getDraft } from '@tipward/contract';
import { route } from '../../http/route.ts';
import { getDraft as serve } from '../../services/drafts/get-draft.ts';

export const getDraftRoute = route(getDraft, async ({ actor, params, setETag }) => {
  const { view, etag } = await serve(actor, params.draftId);
  setETag(etag);
  return view;
});
