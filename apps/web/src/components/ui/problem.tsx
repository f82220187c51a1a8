import { asProblem } from '../../lib/api/api-problem.ts';
import { Button } from './button.tsx';

export interface ProblemProps {
  error: unknown;
  /** What was being done: 'The programme could not be loaded.' */
  title?: string | undefined;
  onRetry?: (() => void) | undefined;
}

/** Why something was refused or failed: the reason in words, then each fault with field, value and what is allowed. */
export function Problem({ error, title, onRetry }: ProblemProps) {
  const problem = asProblem(error);
  return (
    <div role="alert" className="border-l-2 border-fails bg-fails-wash px-3 py-2">
      {title !== undefined && <p className="m-0 font-medium">{title}</p>}
      <p className="m-0">{problem.message}</p>
      {problem.faults.length > 0 && (
        <ul className="m-0 mt-1 list-none p-0">
          {problem.faults.map((fault) => (
            <li key={`${fault.field} ${fault.message}`} className="py-0.5">
              <code className="figures text-[13px]">
                {fault.field} = {fault.value}
              </code>{' '}
              {fault.message}
            </li>
          ))}
        </ul>
      )}
      {onRetry !== undefined && (
        <Button small className="mt-2" onClick={onRetry}>
          Try again
        </Button>
      )}
    </div>
  );
}
