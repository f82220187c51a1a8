import { randomBytes } from 'node:crypto';
import { existsSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import { dirname } from 'node:path';

const fresh = () => randomBytes(24).toString('hex');

/** Secrets of this machine, made once and kept in a file that only its owner reads. */
export function loadSecrets(file) {
  if (existsSync(file)) return JSON.parse(readFileSync(file, 'utf8'));
  const secrets = { ownerPassword: fresh(), appPassword: fresh(), session: fresh() };
  mkdirSync(dirname(file), { recursive: true });
  writeFileSync(file, JSON.stringify(secrets), { mode: 0o600 });
  return secrets;
}
