import type { Operation } from '@tipward/contract';
import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { callApi } from './call-api.ts';
import { newKey } from './new-key.ts';
import type { CallInput } from './request.ts';

interface Addressed {
  readonly params?: unknown;
  readonly query?: unknown;
}

/** Key of an answer in the cache: the operation, then what it was asked with. */
export function queryKeyOf(operation: Operation, input: Addressed): readonly unknown[] {
  return [operation.id, input.params ?? null, input.query ?? null];
}

/** Query options of a reading operation: `useQuery(apiQuery(getDesign, { params: { designId } }))`. */
export function apiQuery<O extends Operation>(operation: O, input: CallInput<O>) {
  return queryOptions({
    queryKey: queryKeyOf(operation, input),
    queryFn: ({ signal }) => callApi(operation, { ...input, signal }),
  });
}

/**
 * Mutation of a changing operation. Where the contract allows an Idempotency-Key, each `mutate` carries a fresh one.
 * `invalidates`: the reading operations whose answers may have changed.
 */
export function useApiMutation<O extends Operation>(operation: O, invalidates: readonly Operation[] = []) {
  const client = useQueryClient();
  return useMutation({
    mutationKey: [operation.id],
    mutationFn: (input: CallInput<O>) =>
      callApi(operation, operation.idempotent === true ? { idempotencyKey: newKey(), ...input } : input),
    onSuccess: () =>
      Promise.all(invalidates.map((reading) => client.invalidateQueries({ queryKey: [reading.id] }))),
  });
}
