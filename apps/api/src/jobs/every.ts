import { setTimeout as pause } from 'node:timers/promises';

/**
 * Does something again and again, the pause counted from the end of one time to the start of the next. A failure is
 * reported and does not end it.
 * @returns a function that ends it, after the time that is running
 */
export function every(
  pauseMs: number,
  work: () => Promise<unknown>,
  report: (error: unknown) => void,
): () => Promise<void> {
  const stopping = new AbortController();
  const { signal } = stopping;
  const run = async (): Promise<void> => {
    while (!signal.aborted) {
      await work().catch(report);
      // The only way this pause fails is the abort, which the loop's condition then sees.
      await pause(pauseMs, undefined, { signal }).catch(() => undefined);
    }
  };
  const ended = run();
  return async () => {
    stopping.abort();
    await ended;
  };
}
