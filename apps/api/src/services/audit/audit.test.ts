import pg from 'pg';
import { beforeAll, describe, expect, it } from 'vitest';
import { adminUrl } from '../../../test/admin-connection.ts';
import { makePerson, makeProgramme } from '../../../test/factories.ts';
import { callAs } from '../../../test/sign-in.ts';
import { useTestApi } from '../../../test/test-api.ts';
import { AuditEventRecord } from '../../models/audit-event-record.ts';
import type { Person } from '../../models/person.ts';
import { verifyAudit } from './verify-audit.ts';
import { writeAudit } from './write-audit.ts';

const api = useTestApi();
let person: Person;
let caller: Awaited<ReturnType<typeof callAs>>;
beforeAll(async () => {
  person = await makePerson(api(), { isAdministrator: true });
  caller = await callAs(api(), person);
});
const write = (action: string, detail: Record<string, unknown> = {}) =>
  api().context.db.transaction((transaction) =>
    writeAudit(api().context, transaction, {
      actorId: person.id,
      action,
      subjectKind: 'test',
      subjectId: 'x',
      detail,
    }),
  );

/** As someone with the power to switch the triggers off would alter the record. */
async function tamper(sql: string): Promise<void> {
  const url = adminUrl();
  url.pathname = `/${api().database.name}`;
  const client = new pg.Client({ connectionString: url.href });
  await client.connect();
  try {
    await client.query(`SET session_replication_role = replica; ${sql}`);
  } finally {
    await client.end();
  }
}

it('holds when empty', async () => {
  expect(await verifyAudit()).toEqual({
    holds: true,
    events: 0,
    firstBroken: null,
    lastHash: '0'.repeat(64),
  });
});

it('holds for any detail, also written side by side', async () => {
  const details = [
    { text: 'ä "quoted" 😀', n: 0.1 + 0.2 },
    { n: 1e-300 },
    { n: -0 },
    { list: [1, [2], {}] },
    { gone: undefined },
  ];
  await Promise.all([...details, ...details, ...details].map((detail) => write('test.written', detail)));
  const { holds, events, lastHash } = await verifyAudit();
  expect([holds, events]).toEqual([true, 15]);
  const { body } = await caller.get('/audit/verification');
  expect(body).toEqual({ holds: true, events: 15, firstBroken: null, lastHash });
});

it('writes nothing when what happened is undone', async () => {
  const before = await AuditEventRecord.count();
  await expect(
    api().context.db.transaction(async (transaction) => {
      await writeAudit(api().context, transaction, {
        actorId: null,
        action: 'test.undone',
        subjectKind: 'test',
        subjectId: null,
      });
      throw new Error('undone');
    }),
  ).rejects.toThrow('undone');
  expect(await AuditEventRecord.count()).toBe(before);
});

it('takes no event that does not continue the chain, even from the application itself', async () => {
  const last = await AuditEventRecord.findOne({ order: [['sequence', 'DESC']], rejectOnEmpty: true });
  const forged = {
    at: new Date(),
    actorId: null,
    action: 'test.forged',
    subjectKind: 'test',
    subjectId: null,
    programmeId: null,
    detail: {},
    hash: 'f'.repeat(64),
  };
  for (const link of [
    { sequence: last.sequence + 2, previousHash: last.hash },
    { sequence: last.sequence + 1, previousHash: 'e'.repeat(64) },
  ])
    await expect(AuditEventRecord.create({ ...forged, ...link })).rejects.toThrow(
      /does not continue the chain/u,
    );
});

describe('the list', () => {
  it('goes through all events page by page, newest first', async () => {
    const seen: number[] = [];
    let cursor: string | null = '';
    while (cursor !== null) {
      const query: string = cursor === '' ? '' : `&cursor=${cursor}`;
      const { status, body } = await caller.get(`/audit?limit=4${query}`);
      expect(status).toBe(200);
      seen.push(...body.items.map(({ sequence }: { sequence: number }) => sequence));
      cursor = body.nextCursor;
    }
    expect(seen).toEqual(Array.from({ length: await AuditEventRecord.count() }, (_, i) => seen.length - i));
  });

  it('can be narrowed', async () => {
    await write('test.rare');
    const other = await makePerson(api());
    const programme = await makeProgramme(other);
    const { body } = await caller.get('/audit?action=test.rare');
    expect(body.items).toHaveLength(1);
    expect(body.items[0]).toMatchObject({ action: 'test.rare', actor: { id: person.id } });
    expect((await caller.get(`/audit?actorId=${other.id}`)).body.items).toEqual([]);
    expect((await caller.get(`/audit?programmeId=${programme.id}`)).body.items).toEqual([]);
  });

  it.each(['cursor=x', 'cursor=-1', 'limit=0', 'limit=201', 'limit=x', 'actorId=me'])(
    'refuses %s',
    async (query) => {
      const { status, body } = await caller.get(`/audit?${query}`);
      expect(status).toBe(422);
      expect(body.faults[0].field).toBe(query.split('=')[0]);
    },
  );
});

describe('tampering is found', () => {
  it.each([
    ['an altered detail', `UPDATE audit_events SET detail = '{"n": 2}' WHERE sequence = 3`, 3],
    ['an altered actor', `UPDATE audit_events SET actor_id = NULL WHERE sequence = 2`, 2],
    ['an altered time', `UPDATE audit_events SET at = at + interval '1 ms' WHERE sequence = 2`, 2],
    ['a removed event', `DELETE FROM audit_events WHERE sequence = 2`, 3],
    ['a removed beginning', `DELETE FROM audit_events WHERE sequence = 1`, 2],
  ])('%s', async (_what, sql, firstBroken) => {
    const before = await AuditEventRecord.findAll({ order: ['sequence'], raw: true });
    await tamper(sql);
    expect(await verifyAudit()).toMatchObject({ holds: false, firstBroken });
    await tamper('DELETE FROM audit_events');
    for (const row of before) await AuditEventRecord.create(row);
    expect((await verifyAudit()).holds).toBe(true);
  });
});
