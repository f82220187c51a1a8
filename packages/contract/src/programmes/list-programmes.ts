import { operation } from '../operation.ts';
import { programmeSummary } from './programme.ts';
import { list } from '../values/page.ts';

export const listProgrammes = operation({
  id: 'programmes.list-programmes',
  summary: 'Programmes the caller belongs to (all, for an administrator)',
  method: 'get',
  path: '/programmes',
  access: 'signed-in',
  status: 200,
  params: null,
  query: null,
  body: null,
  response: list(programmeSummary),
});
