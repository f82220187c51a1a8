import type { SpecificationIssue as IssueView } from '@tipward/contract';
import { SpecificationIssue } from '../../models/specification-issue.ts';
import type { Actor } from '../../policies/actor.ts';
import { presentSpecificationIssue } from '../../presenters/specification-issue.ts';
import { loadPersonRefs } from '../people/load-person-refs.ts';
import { findProgramme } from './get-programme.ts';

/** Every issue of the specification, newest first. */
export async function listSpecifications(actor: Actor, programmeId: string): Promise<{ items: IssueView[] }> {
  await findProgramme(actor, programmeId);
  const issues = await SpecificationIssue.findAll({ where: { programmeId }, order: [['issue', 'DESC']] });
  const ref = await loadPersonRefs(issues.map(({ issuedBy }) => issuedBy));
  return { items: issues.map((issue) => presentSpecificationIssue(issue, ref)) };
}
