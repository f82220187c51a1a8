import { getRelease } from '@tipward/contract';
import { route } from '../../http/route.ts';
import { getRelease as serve } from '../../services/releases/get-release.ts';

export const getReleaseRoute = route(getRelease, ({ actor, params }) => serve(actor, params.releaseId));
