import type { Migration } from './migration.ts';
import { roles } from './0001-roles.ts';
import { people } from './0002-people.ts';
import { programmes } from './0003-programmes.ts';
import { designs } from './0004-designs.ts';
import { reviews } from './0005-reviews.ts';
import { releases } from './0006-releases.ts';
import { audit } from './0007-audit.ts';
import { mail } from './0008-mail.ts';
import { permanence } from './0009-permanence.ts';
import { fourEyes } from './0010-four-eyes.ts';
import { versionStates } from './0011-version-states.ts';

export const migrations: readonly Migration[] = [
  roles,
  people,
  programmes,
  designs,
  reviews,
  releases,
  audit,
  mail,
  permanence,
  fourEyes,
  versionStates,
];
