import { listDraftsRoute } from './list-drafts.ts';
import { openDraftRoute } from './open-draft.ts';
import { getDraftRoute } from './get-draft.ts';
import { saveDraftRoute } from './save-draft.ts';
import { discardDraftRoute } from './discard-draft.ts';

export const draftRoutes = [
  listDraftsRoute,
  openDraftRoute,
  getDraftRoute,
  saveDraftRoute,
  discardDraftRoute,
];
