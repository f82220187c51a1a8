import { spawn } from 'node:child_process';
import { createRequire } from 'node:module';
import { mkdtemp, rm, writeFile } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { strToU8, zipSync } from 'fflate';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { airfoilInput, makePerson } from '../../test/factories.ts';
import { useTestApi } from '../../test/test-api.ts';
import { createTestDatabase } from '../../test/test-database.ts';
import { writeAudit } from '../services/audit/write-audit.ts';

const api = useTestApi();
const tsx = createRequire(import.meta.url).resolve('tsx/esm');
const HERE = import.meta.dirname;

interface Ended {
  readonly code: number | null;
  readonly out: string;
  readonly err: string;
}

/** Runs a program from its source, as `node dist/commands/…` runs what is built from it. */
function run(
  name: string,
  args: string[],
  env: Record<string, string>,
  input = '',
  closeEarly = false,
): Promise<Ended> {
  const node = ['--conditions=@tipward/source', '--import', tsx, join(HERE, `${name}.ts`), ...args];
  const child = spawn(process.execPath, node, { env: { PATH: process.env['PATH'] ?? '', ...env } });
  let [out, err] = ['', ''];
  child.stdout.on('data', (chunk: Buffer) => {
    out += chunk.toString();
    if (closeEarly) child.stdout.destroy();
  });
  child.stderr.on('data', (chunk: Buffer) => (err += chunk.toString()));
  child.stdin.end(input);
  return new Promise((resolve) => {
    child.on('close', (code) => {
      resolve({ code, out, err });
    });
  });
}

const [{ alphaDeg, cl, cd } = { alphaDeg: [], cl: [], cd: [] }] = airfoilInput('Foil').polars;
const caseOf = (count: number) =>
  JSON.stringify({
    rotor: {
      bladeCount: 3,
      hubRadiusM: 0.5,
      tipRadiusM: 8,
      stations: [1, 3, 5, 7].map((radiusM) => ({
        radiusM,
        chordM: 0.4,
        twistDeg: 12 - radiusM,
        polar: 'p0',
      })),
    },
    polars: { p0: { alphaDeg, cl, cd } },
    points: Array.from({ length: count }, (_, i) => ({
      windSpeedMS: 8,
      tipSpeedRatio: 1 + (9 * i) / count,
      pitchDeg: 0,
    })),
  });

describe('solve', () => {
  it('writes the result to stdout and ends with 0', async () => {
    const { code, out, err } = await run('solve', [], {}, caseOf(20_000));
    expect([code, err]).toEqual([0, '']);
    expect(JSON.parse(out).points).toHaveLength(20_000);
  });

  it('ends with 2 and says what is wrong, and nothing on stdout', async () => {
    const { code, out, err } = await run(
      'solve',
      [],
      {},
      caseOf(1).replace('"bladeCount":3', '"bladeCount":0'),
    );
    expect([code, out]).toEqual([2, '']);
    expect(err).toContain('rotor.bladeCount is 0; allowed: a whole number at least 1 and at most 100');
  });

  it('is quiet when whoever reads has seen enough', async () => {
    const { code, err } = await run('solve', [], {}, caseOf(20_000), true);
    expect([code, err]).toEqual([0, '']);
  });

  it('refuses text that is not UTF-8', async () => {
    const { code, err } = await run('solve', [], {}, Buffer.from([0x7b, 0xff, 0x7d]).toString('latin1'));
    expect(code).toBe(2);
    expect(err).toContain('line 1, column 2');
  });
});

describe('verify-audit', () => {
  beforeAll(async () => {
    const { context } = api();
    const person = await makePerson(api());
    for (const action of ['test.first', 'test.second', 'test.third'])
      await context.db.transaction((transaction) =>
        writeAudit(context, transaction, {
          actorId: person.id,
          action,
          subjectKind: 'test',
          subjectId: null,
          detail: { n: 1.5, text: 'ä' },
        }),
      );
  });

  it('says that the chain holds', async () => {
    const { code, out } = await run('verify-audit', [], { DATABASE_URL: api().database.appUrl });
    expect(out).toMatch(/^The audit chain holds: 3 events, last hash [0-9a-f]{64}\n$/u);
    expect(code).toBe(0);
  });

  it('says what is missing', async () => {
    const { code, err } = await run('verify-audit', [], {});
    expect(code).toBe(2);
    expect(err).toContain('DATABASE_URL is missing');
  });
});

describe('migrate', () => {
  it('brings an empty database up to date, once', async () => {
    const database = await createTestDatabase('empty');
    try {
      const env = { OWNER_DATABASE_URL: database.ownerUrl };
      const runs = [
        await run('migrate', [], env),
        await run('migrate', [], env),
        await run('migrate', ['sideways'], env),
      ];
      expect(runs.map(({ code }) => code)).toEqual([0, 0, 2]);
      expect(runs[0]?.out).toContain('migrated 0001-roles');
      expect(runs[1]?.out).toBe('nothing to migrate\n');
      expect(runs[2]?.err).toContain('sideways is no direction');
    } finally {
      await database.drop();
    }
  });
});

describe('invite-administrator', () => {
  it('lets the first person in, and no second one', async () => {
    const database = await createTestDatabase();
    try {
      const env = {
        TIPWARD_MODE: 'test',
        TIPWARD_PUBLIC_URL: 'http://127.0.0.1:4180',
        DATABASE_URL: database.appUrl,
        TIPWARD_SECRET: 's'.repeat(32),
      };
      const named = ['--email', 'Wren@example.org', '--name', 'Wren'];
      const first = await run('invite-administrator', named, env);
      expect(first.code).toBe(0);
      expect(first.out).toMatch(/http:\/\/127\.0\.0\.1:4180\/accept-invitation#token=\S{43}\n$/u);
      const second = await run('invite-administrator', named, env);
      expect([second.code, second.out]).toEqual([2, '']);
      expect(second.err).toContain('has people already');
      expect((await run('invite-administrator', ['--name', 'Wren'], env)).err).toContain('E-mail is missing');
    } finally {
      await database.drop();
    }
  });
});

describe('verify-release', () => {
  let folder: string;
  beforeAll(async () => {
    folder = await mkdtemp(join(tmpdir(), 'tipward-release-'));
  });
  afterAll(() => rm(folder, { recursive: true }));

  it('ends with 1 for a package that is not what it says, 2 for none', async () => {
    const path = join(folder, 'release.zip');
    await writeFile(path, zipSync({ 'a.txt': strToU8('a') }));
    const broken = await run('verify-release', [path], {});
    expect([broken.code, broken.out]).toEqual([1, expect.stringContaining('manifest.json is missing')]);
    expect((await run('verify-release', [join(folder, 'no.zip')], {})).code).toBe(2);
    expect((await run('verify-release', [], {})).code).toBe(2);
  });
});
