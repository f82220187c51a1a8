import type { Route } from '../../http/route.ts';

export const peopleRoutes: readonly Route[] = [];
