import type { Role } from '@tipward/contract';
import type { Actor } from './actor.ts';

interface InProgramme {
  readonly programmeId: string;
}

export const roleIn = (actor: Actor, { programmeId }: InProgramme): Role | null =>
  actor.roles.get(programmeId) ?? null;

const holdsAnywhere = (actor: Actor, roles: readonly Role[]): boolean =>
  [...actor.roles.values()].some((role) => roles.includes(role));

/** Specification and releases: every member, and administrators. */
export const canSeeProgramme = (actor: Actor, programme: InProgramme): boolean =>
  actor.isAdministrator || roleIn(actor, programme) !== null;

/** Designs, versions and reviews: those who do the work and those who sign it. */
export const canSeeWork = (actor: Actor, programme: InProgramme): boolean =>
  ['aerodynamicist', 'lead'].includes(roleIn(actor, programme) ?? '');

/** Designs, drafts, versions, asking for review and comments. */
export const canAuthor = (actor: Actor, programme: InProgramme): boolean => canSeeWork(actor, programme);

/** Rename, issue the specification, decide reviews, release. */
export const canLead = (actor: Actor, programme: InProgramme): boolean => roleIn(actor, programme) === 'lead';

export const canCreateProgramme = (actor: Actor): boolean =>
  actor.isAdministrator || holdsAnywhere(actor, ['lead']);

export const canAddAirfoil = (actor: Actor): boolean => holdsAnywhere(actor, ['aerodynamicist', 'lead']);

export const canManageMembers = (actor: Actor): boolean => actor.isAdministrator;
