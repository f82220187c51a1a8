/** An error whose message already says what to do; shown without a stack. */
export class SetupError extends Error {}

/** Runs a script's main function: set-up errors are printed plainly, others with their stack; exit code 1. */
export async function runMain(main) {
  try {
    await main();
  } catch (error) {
    console.error(error instanceof SetupError ? `\n${error.message}` : error);
    process.exitCode = 1;
  }
}

/** Turns an operating-system error into words where there is something a person can do. */
export function explain(error, doing) {
  if (error?.code === 'ENOSPC')
    return new SetupError(`The disk is full while ${doing}. Free some space and run the command again.`);
  if (error?.code === 'EACCES' || error?.code === 'EPERM')
    return new SetupError(
      `No right to write while ${doing}: ${error.path ?? error.message}. Give this user the folder, or run as its owner.`,
    );
  return error;
}
