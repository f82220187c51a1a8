import type { RightsRow } from './rights-row.ts';
import { airfoilRights } from './airfoils.ts';
import { auditRights } from './audit.ts';
import { designRights } from './designs.ts';
import { reviewRights } from './reviews.ts';
import { authRights } from './auth.ts';
import { peopleRights } from './people.ts';
import { programmeRights } from './programmes.ts';
import { systemRights } from './system.ts';

/** Every operation of the API, and what each caller gets. */
export const rightsTable: readonly RightsRow[] = [
  ...authRights,
  ...peopleRights,
  ...programmeRights,
  ...airfoilRights,
  ...designRights,
  ...reviewRights,
  ...auditRights,
  ...systemRights,
];
