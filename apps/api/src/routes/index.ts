import type { Route } from '../http/route.ts';
import { auditRoutes } from './audit/index.ts';
import { airfoilRoutes } from './airfoils/index.ts';
import { authRoutes } from './auth/index.ts';
import { mailRoutes } from './mail/index.ts';
import { peopleRoutes } from './people/index.ts';
import { programmeRoutes } from './programmes/index.ts';
import { systemRoutes } from './system/index.ts';

/** Every route of the API, one for each operation of the contract. */
export const routes: readonly Route[] = [
  ...authRoutes,
  ...peopleRoutes,
  ...programmeRoutes,
  ...airfoilRoutes,
  ...auditRoutes,
  ...mailRoutes,
  ...systemRoutes,
];
