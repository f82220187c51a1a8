import { listDrafts } from '@tipward/contract';
import { route } from '../../http/route.ts';
import { listDrafts as serve } from '../../services/drafts/list-drafts.ts';

export const listDraftsRoute = route(listDrafts, ({ actor }) => serve(actor));
