import type { FieldPath, FieldValues, UseFormReturn } from 'react-hook-form';
import type { ApiProblem } from '../../../lib/api/api-problem.ts';
import { fieldPath } from './field-path.ts';

/**
 * Puts the server's faults on their fields and the focus on the first.
 * @returns null when every fault found its field, otherwise the problem, to be shown as a whole
 */
export function placeFaults<Input extends FieldValues, Output>(
  form: UseFormReturn<Input, unknown, Output>,
  problem: ApiProblem,
): ApiProblem | null {
  const unplaced = problem.faults.filter((fault) => {
    const name = fieldPath(fault.field) as FieldPath<Input>;
    const known = form.control._names.mount.has(name);
    if (known) form.setError(name, { type: 'server', message: fault.message });
    return !known;
  });
  const first = problem.faults.find((fault) => !unplaced.includes(fault));
  if (first !== undefined) form.setFocus(fieldPath(first.field) as FieldPath<Input>);
  return problem.faults.length > 0 && unplaced.length === 0 ? null : problem;
}
