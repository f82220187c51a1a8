import { createDesign } from '@tipward/contract';
import { route } from '../../http/route.ts';
import { createDesign as serve } from '../../services/designs/create-design.ts';

export const createDesignRoute = route(createDesign, ({ context, actor, params, body }) =>
  serve(context, actor, params.programmeId, body),
);
