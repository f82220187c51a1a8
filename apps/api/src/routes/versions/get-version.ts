import { getVersion } from '@tipward/contract';
import { route } from '../../http/route.ts';
import { getVersion as serve } from '../../services/versions/get-version.ts';

export const getVersionRoute = route(getVersion, ({ actor, params }) => serve(actor, params.versionId));
