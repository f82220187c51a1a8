import type { Programme, ProgrammeSummary } from '@tipward/contract';
import type { Actor } from '../policies/actor.ts';
import { canAuthor, canLead, canManageMembers, canSeeWork, roleIn } from '../policies/programmes.ts';
import type { PersonRefs } from './person-ref.ts';
import { presentSpecificationIssue, type SpecificationIssueRecord } from './specification-issue.ts';

interface ProgrammeRecord {
  readonly id: string;
  readonly name: string;
  readonly summary: string;
  readonly createdBy: string;
  readonly createdAt: Date;
  readonly updatedAt: Date;
}

export interface ProgrammeParts {
  readonly programme: ProgrammeRecord;
  readonly latest: SpecificationIssueRecord;
  readonly currentRelease: ProgrammeSummary['currentRelease'];
  readonly attention: ProgrammeSummary['attention'];
}

export function presentProgrammeSummary(actor: Actor, parts: ProgrammeParts): ProgrammeSummary {
  const { programme, latest, currentRelease, attention } = parts;
  return {
    id: programme.id,
    name: programme.name,
    summary: programme.summary,
    role: roleIn(actor, { programmeId: programme.id }),
    latestIssue: latest.issue,
    ratedPowerKW: latest.specification.ratedPowerKW,
    tipRadiusM: latest.specification.tipRadiusM,
    windClass: latest.specification.windClass,
    currentRelease,
    attention,
    updatedAt: programme.updatedAt.toISOString(),
  };
}

export function presentProgramme(actor: Actor, parts: ProgrammeParts, ref: PersonRefs): Programme {
  const { programme, latest } = parts;
  const here = { programmeId: programme.id };
  return {
    ...presentProgrammeSummary(actor, parts),
    createdBy: ref(programme.createdBy),
    createdAt: programme.createdAt.toISOString(),
    specification: presentSpecificationIssue(latest, ref),
    abilities: {
      edit: canLead(actor, here),
      issueSpecification: canLead(actor, here),
      createDesign: canAuthor(actor, here),
      seeWork: canSeeWork(actor, here),
      manageMembers: canManageMembers(actor),
    },
  };
}
