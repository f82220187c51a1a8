import { listDesigns } from '@tipward/contract';
import { route } from '../../http/route.ts';
import { listDesigns as serve } from '../../services/designs/list-designs.ts';

export const listDesignsRoute = route(listDesigns, ({ actor, params }) => serve(actor, params.programmeId));
