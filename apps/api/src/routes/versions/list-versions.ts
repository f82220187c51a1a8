import { listVersions } from '@tipward/contract';
import { route } from '../../http/route.ts';
import { listVersions as serve } from '../../services/versions/list-versions.ts';

export const listVersionsRoute = route(listVersions, ({ actor, params }) => serve(actor, params.programmeId));
