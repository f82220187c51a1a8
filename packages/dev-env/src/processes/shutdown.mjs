import { constants } from 'node:os';

/** What has to be undone before this process ends, newest first: children, PostgreSQL, throw-away folders. */
const undoing = [];
let ending = null;

/** Thrown by whatever is asked to begin, or is cut off, while the process is ending; nothing to report. */
export class Interrupted extends Error {}

/** Registers what to undo at the end; returns a function that takes the registration back. */
export function onShutdown(undo) {
  undoing.push(undo);
  return () => {
    const at = undoing.indexOf(undo);
    if (at !== -1) undoing.splice(at, 1);
  };
}

export const isShuttingDown = () => ending !== null;

/** Undoes everything once, however often it is called; a failure is printed and does not keep the rest from being undone. */
export function shutDown() {
  ending ??= undoAll();
  return ending;
}

async function undoAll() {
  for (let undo = undoing.pop(); undo !== undefined; undo = undoing.pop()) {
    try {
      await undo();
    } catch (error) {
      console.error(error);
      process.exitCode = 1;
    }
  }
}

/**
 * Ends this process in order on Ctrl-C, SIGTERM or a closed terminal; more signals while it ends change nothing.
 * @param interruptedCode exit code then; by default 128 + the signal's number
 */
export function stopOnSignals(interruptedCode) {
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) {
    process.on(signal, () => {
      const code = interruptedCode ?? 128 + constants.signals[signal];
      void shutDown().finally(() => process.exit(process.exitCode ?? code));
    });
  }
}
