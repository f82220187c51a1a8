import { SetupError } from './fail.mjs';

const LEAST = [20, 19];

/** Refuses a Node.js that is too old, in words. */
export function checkNode(version = process.versions.node) {
  const [major = 0, minor = 0] = version.split('.').map(Number);
  if (major > LEAST[0] || (major === LEAST[0] && minor >= LEAST[1])) return;
  throw new SetupError(
    `Node.js ${version} is too old: Tipward needs ${LEAST.join('.')} or newer. Install Node.js 20 and run the command again.`,
  );
}
