import { spawn } from 'node:child_process';
import { SetupError } from '../setup/fail.mjs';
import { stopGroup } from './process-group.mjs';
import { Interrupted, isShuttingDown, onShutdown } from './shutdown.mjs';

/** Programs that run beside each other until all are stopped, at the latest when this process ends. */
export function createServices() {
  const children = [];
  let failed;
  const failure = new Promise((_, reject) => (failed = reject));
  // Whoever waits sees it; a service may also end while nobody does.
  failure.catch(() => {});
  let stopping = false;

  async function stopAll() {
    stopping = true;
    await Promise.all(children.map((child) => stopGroup(child)));
  }
  onShutdown(stopAll);

  return {
    start(name, { command, args, cwd }, env) {
      if (isShuttingDown()) throw new Interrupted();
      const child = spawn(command, args, {
        env,
        cwd,
        stdio: ['ignore', 'inherit', 'inherit'],
        detached: true,
      });
      child.on('error', failed);
      child.on('exit', (code, signal) => {
        if (!stopping)
          failed(new SetupError(`${name} ended with ${code ?? signal}; its messages above say why.`));
      });
      children.push(child);
    },
    /** Process ids, to find the services again after this process was killed. */
    pids: () => children.map((child) => child.pid),
    /** Never resolves; rejects when a service ends by itself. */
    untilOneEnds: () => failure,
    stopAll,
  };
}
