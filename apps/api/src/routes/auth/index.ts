import type { Route } from '../../http/route.ts';

export const authRoutes: readonly Route[] = [];
