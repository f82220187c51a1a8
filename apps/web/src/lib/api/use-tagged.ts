import type { Operation } from '@tipward/contract';
import { useQuery } from '@tanstack/react-query';
import { queryKeyOf } from './api-query.ts';
import { callApiTagged } from './call-api.ts';
import type { CallInput } from './request.ts';

/** What is about to be edited, read afresh together with the ETag that the edit must name. */
export const useTagged = <O extends Operation>(operation: O, input: CallInput<O>) =>
  useQuery({
    queryKey: [...queryKeyOf(operation, input), 'to edit'],
    queryFn: () => callApiTagged(operation, input),
    gcTime: 0,
    staleTime: Infinity,
  });
