import { SetupError } from './fail.mjs';

export const LEAST_NODE = [20, 19];

/** Refuses a Node.js that is too old, in words. */
export function checkNode(version = process.versions.node) {
  const [major = 0, minor = 0] = version.split('.').map(Number);
  if (major > LEAST_NODE[0] || (major === LEAST_NODE[0] && minor >= LEAST_NODE[1])) return;
  throw new SetupError(
    `Node.js ${version} is too old: Tipward needs ${LEAST_NODE.join('.')} or newer. Install Node.js 20 and run the command again.`,
  );
}
