import { getSession } from '@tipward/contract';
import { MutationCache, QueryCache, QueryClient } from '@tanstack/react-query';
import { ApiProblem } from './api-problem.ts';

const RETRIES = 2;

/** Only what may pass by itself is tried again: no answer, or a failing server. */
export function mayPass(error: unknown): boolean {
  return error instanceof ApiProblem && (error.code === 'unreachable' || error.status >= 500);
}

export function createQueryClient(): QueryClient {
  const onError = (error: unknown) => {
    // The session ended under us: the frame asks again who is signed in and shows the sign-in page.
    if (error instanceof ApiProblem && error.code === 'not-signed-in')
      void client.invalidateQueries({ queryKey: [getSession.id] });
  };
  const client: QueryClient = new QueryClient({
    queryCache: new QueryCache({ onError }),
    mutationCache: new MutationCache({ onError }),
    defaultOptions: {
      queries: {
        staleTime: 15_000,
        retry: (count, error) => count < RETRIES && mayPass(error),
      },
      mutations: { retry: false },
    },
  });
  return client;
}
