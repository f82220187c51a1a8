import { issueSpecification } from '@tipward/contract';
import { route } from '../../http/route.ts';
import { issueSpecification as issue } from '../../services/programmes/issue-specification.ts';

export const issueSpecificationRoute = route(issueSpecification, ({ context, actor, params, body }) =>
  issue(context, actor, params.programmeId, body),
);
