import type { Route } from '../../http/route.ts';

export const programmeRoutes: readonly Route[] = [];
