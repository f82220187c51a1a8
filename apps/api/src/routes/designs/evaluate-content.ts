import { evaluateContent } from '@tipward/contract';
import { route } from '../../http/route.ts';
import { evaluateUnsaved } from '../../services/designs/evaluate-content.ts';

export const evaluateContentRoute = route(evaluateContent, ({ actor, params, body }) =>
  evaluateUnsaved(actor, params.programmeId, body.content),
);
