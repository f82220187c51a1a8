import { beforeAll, beforeEach, describe, expect, it } from 'vitest';
import {
  makeBareVersion,
  makeDesign,
  makePerson,
  makeProgramme,
  REQUIREMENTS,
  sha256Of,
  someId,
  SPECIFICATION,
} from '../../../test/factories.ts';
import { callAs } from '../../../test/sign-in.ts';
import { useTestApi } from '../../../test/test-api.ts';
import { AuditEventRecord } from '../../models/audit-event-record.ts';
import { Decision } from '../../models/decision.ts';
import { Draft } from '../../models/draft.ts';
import type { Person } from '../../models/person.ts';
import { Programme } from '../../models/programme.ts';
import { Review } from '../../models/review.ts';
import { SpecificationIssue } from '../../models/specification-issue.ts';

const api = useTestApi();
let lead: Person;
let author: Person;
let asLead: Awaited<ReturnType<typeof callAs>>;
let programme: Programme;
const content = { specification: SPECIFICATION, requirements: REQUIREMENTS };

beforeAll(async () => {
  lead = await makePerson(api(), { name: 'Lead' });
  author = await makePerson(api());
});
beforeEach(async () => {
  programme = await makeProgramme(lead, [
    [lead, 'lead'],
    [author, 'aerodynamicist'],
  ]);
  asLead = await callAs(api(), lead);
});

describe('creating', () => {
  it('keeps specification and requirements as issue 1 and makes the caller lead', async () => {
    const { status, body, headers } = await asLead.post('/programmes', {
      name: 'Curlew 48',
      summary: '',
      ...content,
    });
    expect(status).toBe(201);
    expect(headers['etag']).toBe('"1"');
    expect(body).toMatchObject({
      name: 'Curlew 48',
      role: 'lead',
      latestIssue: 1,
      ratedPowerKW: 48,
      currentRelease: null,
      attention: { reviewsToDecide: 0, versionsSentBack: 0, openDrafts: 0, approvedToRelease: 0 },
      abilities: {
        edit: true,
        issueSpecification: true,
        createDesign: true,
        seeWork: true,
        manageMembers: false,
      },
    });
    expect(body.specification).toMatchObject({ issue: 1, ...content, specificationHash: sha256Of(content) });
    const events = await AuditEventRecord.findAll({ where: { programmeId: body.id } });
    expect(events.map(({ action }) => action)).toEqual(['programmes.created']);
  });

  it('refuses a name that is taken, whatever its case, and keeps nothing of the second', async () => {
    await asLead.post('/programmes', { name: 'Taken', summary: '', ...content });
    const issues = await SpecificationIssue.count();
    const { status, body } = await asLead.post('/programmes', { name: 'tAKEN', summary: '', ...content });
    expect([status, body.code]).toEqual([409, 'conflict']);
    expect(await SpecificationIssue.count()).toBe(issues);
  });

  it.each([
    ['quotes', `O'Hara "the" \\ rotor; DROP TABLE people;--`],
    ['emoji', '🌬️ rotor 👩🏽‍🔬'],
    ['right-to-left text', 'شفرات الدوّار'],
    ['markup', '<script>alert(1)</script>'],
  ])('takes a name with %s as it is', async (_what, name) => {
    const { status, body } = await asLead.post('/programmes', { name, summary: name, ...content });
    expect(status).toBe(201);
    expect([body.name, body.summary]).toEqual([name, name]);
    expect((await asLead.get(`/programmes/${body.id}`)).body.name).toBe(name);
  });

  it.each([
    ['10,000 characters', 'x'.repeat(10_000), 'name'],
    ['nothing', '   ', 'name'],
    ['a line break', 'two\nlines', 'name'],
    ['NUL', 'a\u0000b', 'name'],
    ['half a surrogate pair', 'a\ud800b', 'name'],
    ['a direction override', 'a\u202eb', 'name'],
  ])('refuses a name with %s and names the field', async (_what, name, field) => {
    const { status, body } = await asLead.post('/programmes', { name, summary: '', ...content });
    expect(status).toBe(422);
    expect(body.faults.length).toBeGreaterThan(0);
    for (const fault of body.faults) {
      expect(fault.field).toBe(field);
      expect(fault.value.length).toBeLessThanOrEqual(80);
    }
  });

  it.each([
    ['1e999', '1e999', 422],
    ['-1e999', '-1e999', 422],
    ['text with a decimal comma', '"1,5"', 422],
    ['null', 'null', 422],
    ['out of range', '-3', 422],
    ['NaN', 'NaN', 400],
    ['a bare decimal comma', '1,5', 400],
  ])('answers a rated power of %s with what is allowed', async (_what, text, expected) => {
    const raw = JSON.stringify({ name: `P ${someId()}`, summary: '', ...content }).replace(
      '"ratedPowerKW":48',
      `"ratedPowerKW":${text}`,
    );
    const { status, body } = await asLead
      .send('post', '/programmes')
      .set('Content-Type', 'application/json')
      .send(raw);
    expect(status).toBe(expected);
    if (expected === 422) {
      expect(body.faults).toHaveLength(1);
      expect(body.faults[0].field).toBe('specification.ratedPowerKW');
      expect(body.faults[0].message).toContain('allowed: a number above 0 and at most 50000 kW');
    } else expect(body.detail).toMatch(/Line 1, column \d+: /u);
  });

  it('reads -0 as 0', async () => {
    const raw = JSON.stringify({ name: `P ${someId()}`, summary: '', ...content }).replace(
      '"coneDeg":0',
      '"coneDeg":-0',
    );
    const { status, body } = await asLead
      .send('post', '/programmes')
      .set('Content-Type', 'application/json')
      .send(raw);
    expect(status).toBe(201);
    expect(body.specification.specificationHash).toBe(sha256Of(content));
    const stored = await SpecificationIssue.findOne({ where: { programmeId: body.id }, rejectOnEmpty: true });
    expect(Object.is(stored.specification.coneDeg, 0)).toBe(true);
  });

  it('tells everything that is wrong at once, and what it does not know', async () => {
    const before = await Programme.count();
    const { body } = await asLead.post('/programmes', {
      name: '',
      extra: true,
      specification: { ...SPECIFICATION, bladeCount: 2.5, windClass: 'IV' },
      requirements: [{ kind: 'max-chord', limit: -1, reason: '' }],
    });
    expect(new Set(body.faults.map(({ field }: { field: string }) => field))).toEqual(
      new Set([
        'name',
        'extra',
        'specification.bladeCount',
        'specification.windClass',
        'requirements[0].limit',
        'requirements[0].reason',
      ]),
    );
    expect(await Programme.count()).toBe(before);
  });

  it('does it once for one Idempotency-Key, also when sent twice at the same moment', async () => {
    const body = { name: `Once ${someId()}`, summary: '', ...content };
    const key = someId();
    const send = () => asLead.post('/programmes', body).set('Idempotency-Key', key);
    const answers = await Promise.all([send(), send()]);
    expect(answers.map(({ status }) => status).toSorted()[0]).toBe(201);
    const again = await send();
    expect([again.status, again.headers['etag']]).toEqual([201, '"1"']);
    expect(again.body.name).toBe(body.name);
    expect(await Programme.count({ where: { name: body.name } })).toBe(1);
    const wrong = await asLead.post('/programmes', { ...body, name: '' }).set('Idempotency-Key', 'has space');
    expect(wrong.status).toBe(422);
  });

  it('keeps no answer to a refused request, so it can be corrected', async () => {
    const key = someId();
    await asLead.post('/programmes', { name: 'Corrected', summary: '', ...content });
    const send = (name: string) =>
      asLead.post('/programmes', { name, summary: '', ...content }).set('Idempotency-Key', key);
    expect((await send('Corrected')).status).toBe(409);
    expect((await send('Corrected now')).status).toBe(201);
  });
});

describe('editing', () => {
  it('needs the ETag, and the loser of a race sees what stands', async () => {
    const at = `/programmes/${programme.id}`;
    const etag = String((await asLead.get(at)).headers['etag']);
    expect((await asLead.patch(at, { name: 'A', summary: '' })).status).toBe(428);
    const first = await asLead.patch(at, { name: `First ${someId()}`, summary: 'one' }, etag);
    expect([first.status, first.headers['etag']]).toEqual([200, '"2"']);
    const second = await asLead.patch(at, { name: 'Second', summary: 'two' }, etag);
    expect([second.status, second.body.code]).toEqual([412, 'stale']);
    expect(second.body).toMatchObject({
      currentETag: '"2"',
      current: { name: first.body.name, summary: 'one' },
    });
  });

  it('lets one of two edits through that come at the same moment', async () => {
    const at = `/programmes/${programme.id}`;
    const edits = ['a', 'b', 'c'].map((summary) =>
      asLead.patch(at, { name: programme.name, summary }, '"1"'),
    );
    const statuses = (await Promise.all(edits)).map(({ status }) => status);
    expect(statuses.toSorted()).toEqual([200, 412, 412]);
  });
});

describe('issuing the specification', () => {
  const issue = (afterIssue: number, specification: object = SPECIFICATION) =>
    asLead.post(`/programmes/${programme.id}/specifications`, {
      afterIssue,
      note: 'New',
      ...content,
      specification,
    });

  it('numbers the issues and keeps the earlier ones', async () => {
    const { status, body } = await issue(1, { ...SPECIFICATION, ratedPowerKW: 50 });
    expect([status, body.issue]).toEqual([201, 2]);
    expect((await issue(1)).status).toBe(409);
    const { body: list } = await asLead.get(`/programmes/${programme.id}/specifications`);
    expect(list.items.map((item: { issue: number }) => item.issue)).toEqual([2, 1]);
    expect(list.items[1].specification.ratedPowerKW).toBe(48);
    expect((await asLead.get(`/programmes/${programme.id}`)).body).toMatchObject({
      latestIssue: 2,
      ratedPowerKW: 50,
    });
  });

  it('lets one of two issues through that come at the same moment', async () => {
    const statuses = (await Promise.all([issue(1), issue(1), issue(1)])).map(({ status }) => status);
    expect(statuses.toSorted()).toEqual([201, 409, 409]);
  });
});

describe('what waits', () => {
  it('is counted for each person by role and authorship', async () => {
    const design = await makeDesign(programme, author);
    const [sentBack, approved, inReview] = [
      await makeBareVersion(design, author, 1),
      await makeBareVersion(design, author, 2),
      await makeBareVersion(design, author, 3),
    ];
    const decided = [
      [sentBack, 'changes-requested'],
      [approved, 'approved'],
    ] as const;
    for (const [version, outcome] of decided) {
      const review = await Review.create({ versionId: version.id, message: '', askedBy: author.id });
      const { contentHash, specificationHash } = version;
      await Decision.create({
        ...{ reviewId: review.id, versionId: version.id, outcome, note: '', contentHash, specificationHash },
        decidedBy: lead.id,
      });
    }
    await Review.create({ versionId: inReview.id, message: '', askedBy: author.id });
    await Draft.create({
      designId: design.id,
      authorId: author.id,
      parentVersionId: null,
      content: inReview.content,
    });
    const attentionOf = async (person: Person) =>
      (await (await callAs(api(), person)).get(`/programmes/${programme.id}`)).body.attention;
    expect(await attentionOf(lead)).toEqual({
      reviewsToDecide: 1,
      versionsSentBack: 0,
      openDrafts: 0,
      approvedToRelease: 1,
    });
    expect(await attentionOf(author)).toEqual({
      reviewsToDecide: 0,
      versionsSentBack: 1,
      openDrafts: 1,
      approvedToRelease: 0,
    });
    const administrator = await makePerson(api(), { isAdministrator: true });
    expect(Object.values(await attentionOf(administrator))).toEqual([0, 0, 0, 0]);
  });
});
