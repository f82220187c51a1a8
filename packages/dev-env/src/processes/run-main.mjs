import { SetupError, explain } from '../setup/fail.mjs';
import { checkNode } from '../setup/node-version.mjs';
import { isShuttingDown, shutDown, stopOnSignals } from './shutdown.mjs';

/** Prints a failure: those that say what to do plainly, all others with their stack. */
export function printFailure(error) {
  const explained = explain(error);
  console.error(explained instanceof SetupError ? `\n${explained.message}` : explained);
}

/**
 * Runs a command's main function and undoes what it began, whether it ends, fails or is interrupted.
 * @param options.interruptedCode exit code after a signal, 0 for commands that run until they are stopped
 */
export async function runMain(main, { interruptedCode } = {}) {
  stopOnSignals(interruptedCode);
  try {
    checkNode();
    await main();
  } catch (error) {
    // While the process is ending, whatever was under way fails; the signal is the reason, not a fault.
    if (isShuttingDown()) return;
    printFailure(error);
    process.exitCode = 1;
  }
  if (!isShuttingDown()) await shutDown();
}
