import type { RightsRow } from './rights-row.ts';
import { airfoilRights } from './airfoils.ts';
import { auditRights } from './audit.ts';
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
  ...auditRights,
  ...systemRights,
];

/** Operations of the contract that no route answers yet. They leave this list with the commit that adds them. */
export const PENDING: readonly string[] = [
  'designs.list-designs',
  'designs.create-design',
  'designs.get-design',
  'designs.rename-design',
  'designs.evaluate-content',
  'drafts.list-drafts',
  'drafts.open-draft',
  'drafts.get-draft',
  'drafts.save-draft',
  'drafts.discard-draft',
  'versions.save-version',
  'versions.list-versions',
  'versions.get-version',
  'reviews.list-reviews',
  'reviews.ask-for-review',
  'reviews.get-review',
  'reviews.add-comment',
  'reviews.resolve-comment',
  'reviews.decide-review',
  'reviews.withdraw-review',
  'releases.release-version',
  'releases.list-releases',
  'releases.get-release',
  'releases.download-package',
];
