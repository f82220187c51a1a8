import { SetupError } from '../setup/fail.mjs';

const STEP_MS = 150;

/** Waits until the server answers its health check; gives up in words. */
export async function waitHealthy(url, seconds = 40) {
  const end = Date.now() + seconds * 1000;
  while (Date.now() < end) {
    const answer = await fetch(`${url}/api/v1/health`).catch(() => null);
    if (answer?.ok === true) return;
    await new Promise((resolve) => setTimeout(resolve, STEP_MS));
  }
  throw new SetupError(
    `The server did not answer at ${url} within ${seconds} seconds. Its messages above say why.`,
  );
}
