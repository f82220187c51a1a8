import { execFileSync, spawnSync } from 'node:child_process';
import { chownSync, existsSync, statSync } from 'node:fs';
import { SetupError } from '../setup/fail.mjs';

function idsOf(user) {
  const id = (flag) => Number(execFileSync('id', [flag, user], { encoding: 'utf8' }));
  return { uid: id('-u'), gid: id('-g') };
}

/** Owner of a folder that exists and is not root's; root cannot run PostgreSQL. */
function ownerOf(dataDir) {
  if (!existsSync(dataDir)) return null;
  const { uid, gid } = statSync(dataDir);
  return uid === 0 ? null : { uid, gid };
}

/** As root: PostgreSQL refuses to run as root, so its programs run as the owner of the data, at first Debian's `postgres`. */
function droppingTo({ uid, gid }) {
  const asServer = (program, args) => [
    'setpriv',
    [`--reuid=${uid}`, `--regid=${gid}`, '--init-groups', '--reset-env', program, ...args],
  ];
  return {
    asServer,
    giveToServer: (path) => chownSync(path, uid, gid),
    /** Whether that user gets through every folder down to `folder`. */
    reaches: (folder) => spawnSync(...asServer('/usr/bin/test', ['-x', folder]), { cwd: '/' }).status === 0,
  };
}

/**
 * How PostgreSQL's programs for `dataDir` are run: { asServer(program, args), giveToServer(path), reaches(folder) }.
 * @throws SetupError where the data belong to someone else
 */
export function serverUser(dataDir, self = process.getuid()) {
  const owner = ownerOf(dataDir);
  if (self === 0) return droppingTo(owner ?? idsOf('postgres'));
  if (existsSync(dataDir) && owner?.uid !== self)
    throw new SetupError(
      `The data in ${dataDir} belong to another user (${statSync(dataDir).uid}). Run the command as root or as that ` +
        'user, or have them removed to start with an empty demo.',
    );
  return { asServer: (program, args) => [program, args], giveToServer: () => {}, reaches: () => true };
}
