import { REQUIREMENT_KINDS, SPECIFICATION_RULES } from '@tipward/contract';
import type { Requirement, Specification, SpecificationIssue } from '@tipward/contract';
import { limitText } from './requirement-text.ts';
import { CONTROL_WORDS, shownNumber } from './specification-fields.ts';

export interface SpecificationChange {
  readonly what: string;
  readonly unit: string;
  readonly before: string;
  readonly after: string;
}

type Content = Pick<SpecificationIssue, 'specification' | 'requirements'>;
const NONE = 'none';

function named(field: keyof Specification): { what: string; unit: string } {
  if (field === 'control') return { what: 'Control', unit: '' };
  if (field === 'windClass') return { what: 'Wind class', unit: '' };
  const { label, unit } = SPECIFICATION_RULES[field];
  return { what: label, unit };
}

function shown(specification: Specification, field: keyof Specification): string {
  if (field === 'control') return CONTROL_WORDS[specification.control];
  if (field === 'windClass') return specification.windClass;
  return shownNumber(specification[field]);
}

function limitOf(list: readonly Requirement[], kind: Requirement['kind']): string {
  const found = list.find((one) => one.kind === kind);
  return found === undefined ? NONE : limitText(found);
}

/** What differs between two issues, field by field and limit by limit. */
export function specificationChanges(before: Content, after: Content): SpecificationChange[] {
  const fields = (Object.keys(after.specification) as (keyof Specification)[])
    .filter((field) => before.specification[field] !== after.specification[field])
    .map((field) => ({
      ...named(field),
      before: shown(before.specification, field),
      after: shown(after.specification, field),
    }));
  const kinds = [...new Set([...before.requirements, ...after.requirements].map(({ kind }) => kind))];
  const limits = kinds
    .map((kind) => ({
      what: REQUIREMENT_KINDS[kind].label,
      unit: REQUIREMENT_KINDS[kind].unit,
      before: limitOf(before.requirements, kind),
      after: limitOf(after.requirements, kind),
    }))
    .filter((change) => change.before !== change.after);
  return [...fields, ...limits];
}
