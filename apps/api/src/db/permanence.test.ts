import pg from 'pg';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { urlAs } from '../../test/admin-connection.ts';
import {
  airfoilInput,
  makeAirfoil,
  makeBareVersion,
  makeDesign,
  makePerson,
  makeProgramme,
  sha256Of,
} from '../../test/factories.ts';
import { useTestApi } from '../../test/test-api.ts';
import { Decision } from '../models/decision.ts';
import { EvaluationRecord } from '../models/evaluation-record.ts';
import type { Person } from '../models/person.ts';
import type { Programme } from '../models/programme.ts';
import { Release } from '../models/release.ts';
import { Review } from '../models/review.ts';
import { ReviewWithdrawal } from '../models/review-withdrawal.ts';
import type { Version } from '../models/version.ts';
import { VersionState } from '../models/version-state.ts';
import { writeAudit } from '../services/audit/write-audit.ts';
import { PERMANENT_TABLES } from './migrations/0009-permanence.ts';
import { sha256 } from '../../test/bytes.ts';

const api = useTestApi();
let author: Person;
let lead: Person;
let programme: Programme;
let version: Version;
let number = 1;

const askForReview = (of: Version) => Review.create({ versionId: of.id, message: '', askedBy: author.id });
const nextVersion = async () => makeBareVersion(await makeDesign(programme, author), author, (number += 1));
const decide = (
  review: Review,
  of: Version,
  decidedBy: string,
  outcome: 'approved' | 'changes-requested' = 'approved',
) =>
  Decision.create({
    reviewId: review.id,
    versionId: of.id,
    outcome,
    note: '',
    contentHash: of.contentHash,
    specificationHash: of.specificationHash,
    decidedBy,
  });
const release = (of: Version, releasedBy: string, sequence: number) => {
  const bytes = Buffer.from('package');
  return Release.create({
    programmeId: programme.id,
    versionId: of.id,
    sequence,
    letter: String.fromCharCode(64 + sequence),
    effectivity: 'From blade set 12',
    note: '',
    package: bytes,
    packageSha256: sha256(bytes),
    packageBytes: bytes.length,
    manifest: [],
    releasedBy,
  });
};
const stateOf = async (of: Version) => (await VersionState.findByPk(of.id))?.state;

beforeAll(async () => {
  author = await makePerson(api());
  lead = await makePerson(api());
  programme = await makeProgramme(lead, [
    [author, 'aerodynamicist'],
    [lead, 'lead'],
  ]);
  version = await makeBareVersion(await makeDesign(programme, author), author);
  const review = await askForReview(version);
  await decide(review, version, lead.id);
  await release(version, lead.id, 1);
  const other = await nextVersion();
  await ReviewWithdrawal.create({ reviewId: (await askForReview(other)).id, withdrawnBy: author.id });
  await makeAirfoil(lead, airfoilInput('Foil of the test'));
  await EvaluationRecord.create({
    contentHash: sha256Of(1),
    specificationHash: sha256Of(2),
    solverVersion: '0',
    evaluation: {} as EvaluationRecord['evaluation'],
  });
  await api().context.db.transaction((transaction) =>
    writeAudit(api().context, transaction, {
      actorId: lead.id,
      action: 'test.happened',
      subjectKind: 'test',
      subjectId: null,
    }),
  );
});

describe.each(['tipward_app', 'tipward_owner'] as const)('as %s', (role) => {
  let client: pg.Client;
  beforeAll(async () => {
    client = new pg.Client({ connectionString: urlAs(role, api().database.name) });
    await client.connect();
  });
  afterAll(() => client.end());

  it.each(PERMANENT_TABLES)('%s: UPDATE, DELETE and TRUNCATE are refused', async (table) => {
    const { rows } = await client.query(`SELECT count(*)::int AS n FROM ${table}`);
    expect(rows[0].n, 'there is a row to protect').toBeGreaterThan(0);
    const column = (await client.query(`SELECT * FROM ${table} LIMIT 1`)).fields[0]?.name ?? '';
    const refused = role === 'tipward_app' ? /permission denied/u : /are permanent records/u;
    await expect(client.query(`UPDATE ${table} SET ${column} = ${column}`)).rejects.toThrow(refused);
    await expect(client.query(`DELETE FROM ${table}`)).rejects.toThrow(refused);
    await expect(client.query(`TRUNCATE ${table} CASCADE`)).rejects.toThrow(refused);
    const after = await client.query(`SELECT count(*)::int AS n FROM ${table}`);
    expect(after.rows[0].n).toBe(rows[0].n);
  });
});

it('refuses even an application role that was granted everything', async () => {
  const owner = new pg.Client({ connectionString: api().database.ownerUrl });
  const app = new pg.Client({ connectionString: api().database.appUrl });
  await owner.connect();
  await app.connect();
  try {
    await owner.query('GRANT ALL ON ALL TABLES IN SCHEMA public TO tipward_app');
    for (const table of PERMANENT_TABLES) {
      const column = (await app.query(`SELECT * FROM ${table} LIMIT 1`)).fields[0]?.name ?? '';
      await expect(app.query(`UPDATE ${table} SET ${column} = ${column}`)).rejects.toThrow(
        /permanent records: UPDATE/u,
      );
      await expect(app.query(`DELETE FROM ${table}`)).rejects.toThrow(/permanent records: DELETE/u);
      await expect(app.query(`TRUNCATE ${table} CASCADE`)).rejects.toThrow(/permanent records: TRUNCATE/u);
    }
    await expect(app.query('ALTER TABLE versions DISABLE TRIGGER ALL')).rejects.toThrow(/must be owner/u);
    await expect(app.query('CREATE TABLE own (id integer)')).rejects.toThrow(
      /permission denied for schema public/u,
    );
  } finally {
    await owner.end();
    await app.end();
  }
});

describe('four eyes', () => {
  it('refuses the decision of the author', async () => {
    const own = await nextVersion();
    const review = await askForReview(own);
    await expect(decide(review, own, author.id)).rejects.toThrow(/four eyes/u);
  });

  it('refuses a decision on other content, on a withdrawn review and a withdrawal after the decision', async () => {
    const own = await nextVersion();
    const review = await askForReview(own);
    const altered = own.set('contentHash', sha256Of('other'));
    await expect(decide(review, altered, lead.id)).rejects.toThrow(/other content/u);
    await own.reload();
    await ReviewWithdrawal.create({ reviewId: review.id, withdrawnBy: author.id });
    await expect(decide(review, own, lead.id)).rejects.toThrow(/withdrawn/u);
    const second = await askForReview(own);
    await decide(second, own, lead.id, 'changes-requested');
    await expect(ReviewWithdrawal.create({ reviewId: second.id, withdrawnBy: author.id })).rejects.toThrow(
      /decided/u,
    );
  });

  it('refuses a release by the author, without approval, and after approval gave way to a new review', async () => {
    const own = await nextVersion();
    await expect(release(own, lead.id, 2)).rejects.toThrow(/has not approved/u);
    await decide(await askForReview(own), own, lead.id);
    await expect(release(own, author.id, 2)).rejects.toThrow(/four eyes/u);
    await askForReview(own);
    await expect(release(own, lead.id, 2)).rejects.toThrow(/has not approved/u);
  });
});

it('derives the state of a version from what is recorded', async () => {
  const own = await nextVersion();
  expect(await stateOf(own)).toBe('saved');
  const first = await askForReview(own);
  expect(await stateOf(own)).toBe('in-review');
  await decide(first, own, lead.id, 'changes-requested');
  expect(await stateOf(own)).toBe('changes-requested');
  await ReviewWithdrawal.create({ reviewId: (await askForReview(own)).id, withdrawnBy: author.id });
  expect(await stateOf(own)).toBe('withdrawn');
  await decide(await askForReview(own), own, lead.id);
  expect(await stateOf(own)).toBe('approved');
  expect(await stateOf(version)).toBe('released');
  await release(own, lead.id, 2);
  expect(await stateOf(own)).toBe('released');
  expect(await stateOf(version)).toBe('superseded');
});
