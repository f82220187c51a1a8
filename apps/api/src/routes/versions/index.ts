import { saveVersionRoute } from './save-version.ts';
import { listVersionsRoute } from './list-versions.ts';
import { getVersionRoute } from './get-version.ts';

export const versionRoutes = [saveVersionRoute, listVersionsRoute, getVersionRoute];
