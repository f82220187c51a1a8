import { setTimeout as sleep } from 'node:timers/promises';
import { SetupError } from '../setup/fail.mjs';
import { Interrupted, isShuttingDown } from './shutdown.mjs';

const STEP_MS = 150;

/** Waits until the server answers its health check; gives up in words. */
export async function waitHealthy(url, seconds = 60) {
  const end = Date.now() + seconds * 1000;
  while (Date.now() < end) {
    if (isShuttingDown()) throw new Interrupted();
    // A refused connection is what is waited out.
    const answer = await fetch(`${url}/api/v1/health`).catch(() => null);
    if (answer?.ok === true) return;
    await sleep(STEP_MS);
  }
  throw new SetupError(
    `The server did not answer at ${url} within ${seconds} seconds. Its messages above say why.`,
  );
}
