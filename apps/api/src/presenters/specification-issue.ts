import type { Requirement, Specification, SpecificationIssue } from '@tipward/contract';
import type { PersonRefs } from './person-ref.ts';

export interface SpecificationIssueRecord {
  readonly issue: number;
  readonly note: string;
  readonly specification: Specification;
  readonly requirements: readonly Requirement[];
  readonly specificationHash: string;
  readonly issuedBy: string;
  readonly issuedAt: Date;
}

export function presentSpecificationIssue(
  record: SpecificationIssueRecord,
  ref: PersonRefs,
): SpecificationIssue {
  return {
    issue: record.issue,
    note: record.note,
    specification: record.specification,
    requirements: [...record.requirements],
    specificationHash: record.specificationHash,
    issuedBy: ref(record.issuedBy),
    issuedAt: record.issuedAt.toISOString(),
  };
}
