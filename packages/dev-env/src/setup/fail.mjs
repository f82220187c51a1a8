/** An error whose message already says what to do; shown without a stack. */
export class SetupError extends Error {}

export const FULL_DISK = 'The disk is full: free some space and run the command again.';

/** Turns an operating-system error into words where there is something a person can do; other errors stay as they are. */
export function explain(error) {
  if (error?.code === 'ENOSPC') return new SetupError(`${error.message}\n${FULL_DISK}`);
  if (error?.code === 'EACCES' || error?.code === 'EPERM')
    return new SetupError(
      `This user has no right to ${error.syscall ?? 'use'} ${error.path ?? error.message}. ` +
        'Run the command as the owner of that file or folder, or give it to this user.',
    );
  return error;
}
