import type { Route } from '../../http/route.ts';

export const mailRoutes: readonly Route[] = [];
