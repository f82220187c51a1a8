const GRACE_MS = 8000;

function signalGroup(pid, signal) {
  try {
    process.kill(-pid, signal);
  } catch (error) {
    if (error.code !== 'ESRCH') throw error;
  }
}

/**
 * Stops a child that was spawned `detached` (it leads a group of its own) together with its descendants. Who does not end
 * within eight seconds is killed. Resolves when the child has ended.
 */
export function stopGroup(child, signal = 'SIGTERM') {
  return new Promise((resolve) => {
    if (child.pid === undefined || child.exitCode !== null || child.signalCode !== null) return resolve();
    const hard = setTimeout(() => signalGroup(child.pid, 'SIGKILL'), GRACE_MS);
    child.once('exit', () => {
      clearTimeout(hard);
      resolve();
    });
    signalGroup(child.pid, signal);
  });
}
