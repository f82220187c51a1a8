import type { Route } from '../../http/route.ts';

export const airfoilRoutes: readonly Route[] = [];
