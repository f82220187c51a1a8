import type { Route } from '../../http/route.ts';

export const auditRoutes: readonly Route[] = [];
