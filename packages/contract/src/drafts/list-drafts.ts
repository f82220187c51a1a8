import { operation } from '../operation.ts';
import { draftSummary } from './draft.ts';
import { list } from '../values/page.ts';

export const listDrafts = operation({
  id: 'drafts.list-drafts',
  summary: 'The caller’s drafts, latest first',
  method: 'get',
  path: '/drafts',
  access: 'signed-in',
  status: 200,
  params: null,
  query: null,
  body: null,
  response: list(draftSummary),
});
