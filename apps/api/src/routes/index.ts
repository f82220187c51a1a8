import type { Route } from '../http/route.ts';
import { auditRoutes } from './audit/index.ts';
import { airfoilRoutes } from './airfoils/index.ts';
import { authRoutes } from './auth/index.ts';
import { designRoutes } from './designs/index.ts';
import { draftRoutes } from './drafts/index.ts';
import { versionRoutes } from './versions/index.ts';
import { reviewRoutes } from './reviews/index.ts';
import { releaseRoutes } from './releases/index.ts';
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
  ...designRoutes,
  ...draftRoutes,
  ...versionRoutes,
  ...reviewRoutes,
  ...releaseRoutes,
  ...auditRoutes,
  ...mailRoutes,
  ...systemRoutes,
];
