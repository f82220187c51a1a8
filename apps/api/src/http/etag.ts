import { AppError } from './app-error.ts';

/** The ETag of something with a revision: "3" in quotes, as HTTP writes it. */
export const revisionETag = (revision: number): string => `"${revision}"`;

/**
 * Holds the ETag that a change names against the state as it is.
 * @throws AppError `stale` with the document as it stands, so that the loser of a race sees both.
 */
export function requireMatch(ifMatch: string, currentETag: string, current: unknown): void {
  if (ifMatch !== currentETag)
    throw new AppError(
      'stale',
      `It was changed in the meantime: it stands at ${currentETag}, not ${ifMatch}.`,
      {
        current,
        currentETag,
      },
    );
}
