import { releaseVersionRoute } from './release-version.ts';
import { listReleasesRoute } from './list-releases.ts';
import { getReleaseRoute } from './get-release.ts';
import { downloadPackageRoute } from './download-package.ts';

export const releaseRoutes = [releaseVersionRoute, listReleasesRoute, getReleaseRoute, downloadPackageRoute];
