import { useEffect, useSyncExternalStore } from 'react';
import type { LatestOnly } from './latest-only.ts';

export interface Latest<O> {
  /** The newest answer there is, perhaps of an earlier input; null before the first. */
  readonly output: O | null;
  /** True only when `output` answers exactly the input given now. */
  readonly current: boolean;
  /** Why the input given now could not be solved. */
  readonly error: string | null;
  /** From request to answer (ms). */
  readonly elapsedMs: number | null;
}

/** Follows a channel with an input; null asks for nothing, and nothing counts as current. */
export function useLatest<I, O>(channel: LatestOnly<I, O>, input: I | null): Latest<O> {
  const state = useSyncExternalStore(channel.subscribe, channel.getState);
  useEffect(() => {
    if (input !== null) channel.request(input);
  }, [channel, input]);
  return {
    output: state.shown?.output ?? null,
    current: input !== null && state.shown?.input === input,
    error: input !== null && state.error?.input === input ? state.error.message : null,
    elapsedMs: state.shown?.elapsedMs ?? null,
  };
}
