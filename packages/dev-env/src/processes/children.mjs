import { spawn } from 'node:child_process';

/**
 * Long-running children that end together: on SIGINT or SIGTERM, or when one of them ends by itself, all are stopped, then
 * `afterwards` runs (stopping PostgreSQL) and this process ends.
 */
export function createChildren(afterwards) {
  const children = [];
  let stopping = null;

  function stop(code) {
    stopping ??= (async () => {
      await Promise.all(children.map(stopOne));
      await afterwards();
      process.exit(code);
    })();
    return stopping;
  }

  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, () => void stop(0));

  return {
    start(name, command, args, env, cwd) {
      const child = spawn(command, args, { env, cwd, stdio: ['ignore', 'inherit', 'inherit'] });
      child.on('exit', (code) => {
        if (stopping !== null) return;
        console.error(`\n${name} ended with ${code}; stopping the rest.`);
        void stop(1);
      });
      children.push(child);
      return child;
    },
    stop,
    /** Stops the children and leaves this process running. */
    async endAll() {
      stopping = Promise.resolve();
      await Promise.all(children.map(stopOne));
    },
  };
}

const GRACE_MS = 5000;

function stopOne(child) {
  return new Promise((resolve) => {
    if (child.exitCode !== null || child.signalCode !== null) return resolve();
    const hard = setTimeout(() => child.kill('SIGKILL'), GRACE_MS);
    child.once('exit', () => {
      clearTimeout(hard);
      resolve();
    });
    child.kill('SIGTERM');
  });
}
