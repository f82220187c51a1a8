import { z } from 'zod';
import { personRef, role } from '../people/person.ts';
import { requirement, specification } from './specification.ts';

export const specificationIssue = z.object({
  issue: z.number(),
  note: z.string(),
  specification,
  requirements: z.array(requirement),
  specificationHash: z.string(),
  issuedBy: personRef,
  issuedAt: z.string(),
});
export type SpecificationIssue = z.infer<typeof specificationIssue>;

/** What waits for the person who asks: reviews to decide, versions sent back, drafts open, approved versions to release. */
export const attention = z.object({
  reviewsToDecide: z.number(),
  versionsSentBack: z.number(),
  openDrafts: z.number(),
  approvedToRelease: z.number(),
});

export const programmeSummary = z.object({
  id: z.string(),
  name: z.string(),
  summary: z.string(),
  role: role.nullable(),
  latestIssue: z.number(),
  ratedPowerKW: z.number(),
  tipRadiusM: z.number(),
  windClass: z.string(),
  currentRelease: z
    .object({
      id: z.string(),
      letter: z.string(),
      designName: z.string(),
      versionLabel: z.string(),
      releasedAt: z.string(),
    })
    .nullable(),
  attention,
  updatedAt: z.string(),
});
export type ProgrammeSummary = z.infer<typeof programmeSummary>;

export const programme = programmeSummary.extend({
  createdBy: personRef,
  createdAt: z.string(),
  specification: specificationIssue,
  abilities: z.object({
    edit: z.boolean(),
    issueSpecification: z.boolean(),
    createDesign: z.boolean(),
    seeWork: z.boolean(),
    manageMembers: z.boolean(),
  }),
});
export type Programme = z.infer<typeof programme>;
