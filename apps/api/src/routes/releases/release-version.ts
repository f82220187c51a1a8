import { releaseVersion } from '@tipward/contract';
import { route } from '../../http/route.ts';
import { releaseVersion as serve } from '../../services/releases/release-version.ts';

export const releaseVersionRoute = route(releaseVersion, ({ context, actor, params, body }) =>
  serve(context, actor, params.versionId, body),
);
