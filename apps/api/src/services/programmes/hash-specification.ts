import { createHash } from 'node:crypto';
import type { Requirement, Specification } from '@tipward/contract';
import { canonicalJson } from '@tipward/design-model';

/** SHA-256 over the canonical JSON of specification and requirements together: verdicts follow from both. */
export function hashSpecification(
  specification: Specification,
  requirements: readonly Requirement[],
): string {
  return createHash('sha256').update(canonicalJson({ specification, requirements })).digest('hex');
}
