import { mkdirSync, mkdtempSync, rmSync, statSync, utimesSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, describe, expect, it } from 'vitest';
import { findBinaries } from '../postgres/binaries.mjs';
import { sourceStamp } from './build.mjs';
import { claimLocal, claimant } from './claim.mjs';
import { explain } from './fail.mjs';
import { checkNode } from './node-version.mjs';
import { loadSecrets } from './secrets.mjs';

const folder = mkdtempSync(join(tmpdir(), 'tipward-setup-'));
afterAll(() => rmSync(folder, { recursive: true, force: true }));

describe('the version of Node.js', () => {
  it.each(['20.19.0', '20.20.2', '22.0.0', '100.1.0'])('%s is new enough', (version) => {
    expect(() => checkNode(version)).not.toThrow();
  });

  it.each(['20.18.9', '18.20.4', '4.0.0'])('%s is refused with what to do', (version) => {
    expect(() => checkNode(version)).toThrow(
      `Node.js ${version} is too old: Tipward needs 20.19 or newer. Install`,
    );
  });
});

describe('the stamp of the sources', () => {
  it('changes with a file that a build reads, and with nothing else', () => {
    const place = join(folder, 'packages/solver');
    for (const part of ['src', 'dist', 'node_modules']) mkdirSync(join(place, part), { recursive: true });
    const file = join(place, 'src/a.ts');
    writeFileSync(file, 'a');
    const stamp = () => sourceStamp(['packages'], folder);
    const before = stamp();
    writeFileSync(join(place, 'dist/a.js'), 'a');
    writeFileSync(join(place, 'node_modules/x.js'), 'a');
    expect(stamp()).toBe(before);
    utimesSync(file, new Date(), new Date(2030, 0));
    const touched = stamp();
    expect(touched).not.toBe(before);
    writeFileSync(join(place, 'src/b.ts'), '');
    expect(stamp()).not.toBe(touched);
  });
});

describe('secrets', () => {
  it('are made once, differ, and are readable by their owner only', () => {
    const file = join(folder, 'deep/secrets.json');
    const secrets = loadSecrets(file);
    expect(new Set(Object.values(secrets)).size).toBe(3);
    for (const secret of Object.values(secrets)) expect(secret).toMatch(/^[0-9a-f]{48}$/u);
    expect(statSync(file).mode & 0o777).toBe(0o600);
    expect(loadSecrets(file)).toEqual(secrets);
  });
});

describe('the claim on the local database', () => {
  const file = join(folder, 'running.json');

  it('of a process that is gone, or whose number belongs to another, holds nobody off', async () => {
    writeFileSync(file, JSON.stringify({ pid: 1, url: 'http://127.0.0.1:4310', services: [1] }));
    expect(claimant(file)).toBeNull();
    await claimLocal(file);
    expect(claimant(file)).toBeNull();
  });
});

describe('errors of the system', () => {
  it('say what to do about a full disk and missing rights', () => {
    const full = Object.assign(new Error('write'), { code: 'ENOSPC' });
    expect(explain(full).message).toContain('The disk is full');
    const denied = Object.assign(new Error('x'), { code: 'EACCES', syscall: 'open', path: '/a' });
    expect(explain(denied).message).toContain('no right to open /a');
    const other = new Error('other');
    expect(explain(other)).toBe(other);
  });
});

describe('the programs of PostgreSQL', () => {
  it('are those of the newest version that is whole', () => {
    for (const version of ['9', '15', '17'])
      mkdirSync(join(folder, 'pg', version, 'bin'), { recursive: true });
    writeFileSync(join(folder, 'pg/9/bin/initdb'), '');
    writeFileSync(join(folder, 'pg/15/bin/initdb'), '');
    expect(findBinaries(join(folder, 'pg'))).toBe(join(folder, 'pg/15/bin'));
    expect(findBinaries(join(folder, 'none'))).toBeNull();
  });
});
