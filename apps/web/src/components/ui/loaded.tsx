import type { UseQueryResult } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { ApiProblem } from '../../lib/api/api-problem.ts';
import { Loading } from './loading.tsx';
import { NotFound } from './not-found.tsx';
import { Problem } from './problem.tsx';

/** The states of a query in one place: on its way, failed with a way to try again, not there, and there. */
export function Loaded<T>({
  query,
  what,
  children,
}: {
  query: UseQueryResult<T>;
  /** Read out while waiting: 'the programme'. */
  what: string;
  children: (data: T) => ReactNode;
}) {
  const { data, error } = query;
  const retry = () => void query.refetch();
  if (data !== undefined)
    return (
      <>
        {error !== null && (
          <Problem
            error={error}
            title={`What stands here may be old: ${what} could not be read again.`}
            onRetry={retry}
          />
        )}
        {children(data)}
      </>
    );
  if (error instanceof ApiProblem && error.code === 'not-found') return <NotFound what={what} />;
  if (error !== null) return <Problem error={error} title={`Could not load ${what}.`} onRetry={retry} />;
  return <Loading what={what} />;
}
