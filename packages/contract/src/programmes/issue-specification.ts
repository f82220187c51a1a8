import { z } from 'zod';
import { operation } from '../operation.ts';
import { specificationIssue } from './programme.ts';
import { requirements, specification } from './specification.ts';
import { idValue, nameText } from '../values/text.ts';

export const issueSpecification = operation({
  id: 'programmes.issue-specification',
  summary: 'Issue the specification anew; afterIssue is the issue it was edited from',
  method: 'post',
  path: '/programmes/:programmeId/specifications',
  access: 'signed-in',
  status: 201,
  params: z.object({ programmeId: idValue('ProgrammeId') }),
  query: null,
  body: z.strictObject({
    afterIssue: z
      .number({ error: 'afterIssue is missing; allowed: the issue it was edited from' })
      .int('allowed: a whole number'),
    note: nameText('Note', 500),
    specification,
    requirements,
  }),
  response: specificationIssue,
  idempotent: true,
});
