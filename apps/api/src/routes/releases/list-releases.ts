import { listReleases } from '@tipward/contract';
import { route } from '../../http/route.ts';
import { listReleases as serve } from '../../services/releases/get-release.ts';

export const listReleasesRoute = route(listReleases, ({ actor, params }) => serve(actor, params.programmeId));
