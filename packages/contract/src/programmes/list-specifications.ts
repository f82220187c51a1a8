import { z } from 'zod';
import { operation } from '../operation.ts';
import { idValue } from '../values/text.ts';
import { specificationIssue } from './programme.ts';
import { list } from '../values/page.ts';

export const listSpecifications = operation({
  id: 'programmes.list-specifications',
  summary: 'Every issue of the specification, newest first',
  method: 'get',
  path: '/programmes/:programmeId/specifications',
  access: 'signed-in',
  status: 200,
  params: z.object({ programmeId: idValue('ProgrammeId') }),
  query: null,
  body: null,
  response: list(specificationIssue),
});
