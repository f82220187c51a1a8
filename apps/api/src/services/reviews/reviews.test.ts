import { createHash } from 'node:crypto';
import { unzipSync } from 'fflate';
import { beforeAll, describe, expect, it } from 'vitest';
import { makePerson, PASSWORD } from '../../../test/factories.ts';
import { makeWorld, type World } from '../../../test/rights/world.ts';
import { callAs } from '../../../test/sign-in.ts';
import { useTestApi } from '../../../test/test-api.ts';
import { actorOf, approve, makeApproved, makeRelease, makeReview, makeVersion } from '../../../test/work.ts';
import { checkPackage } from '../../commands/check-package.ts';
import { Membership } from '../../models/membership.ts';
import { OutboxMail } from '../../models/outbox-mail.ts';
import { verifyAudit } from '../audit/verify-audit.ts';

const api = useTestApi({ signInFailuresAllowed: 1000 });
let world: World;
beforeAll(async () => {
  world = await makeWorld(api());
});

const version = () => makeVersion(api(), world.programme, world.people.aerodynamicist);
const review = async () => makeReview(api(), await version(), world.people.aerodynamicist);
const body = (seen: { contentHash: string; specificationHash: string }, outcome = 'approved') => ({
  outcome,
  note: '',
  password: PASSWORD,
  contentHash: seen.contentHash,
  specificationHash: seen.specificationHash,
});

describe('a review', () => {
  it('is decided once by two leads at once', async () => {
    const second = await makePerson(api());
    await Membership.create({ programmeId: world.programme.id, personId: second.id, role: 'lead' });
    const seen = await review();
    const callers = await Promise.all([callAs(api(), world.people.lead), callAs(api(), second)]);
    const answers = await Promise.all(
      callers.map((caller, i) =>
        caller.post(`/reviews/${seen.id}/decision`, body(seen, i === 0 ? 'approved' : 'changes-requested')),
      ),
    );
    expect(answers.map(({ status }) => status).sort()).toEqual([201, 409]);
  });

  it('is never decided by the author of the version, a lead though they be', async () => {
    const own = await makeVersion(api(), world.programme, world.people.lead);
    const seen = await makeReview(api(), own, world.people.lead);
    const answer = await (
      await callAs(api(), world.people.lead)
    ).post(`/reviews/${seen.id}/decision`, body(seen));
    expect(answer.status).toBe(403);
    expect(answer.body.detail).toContain('version of their own');
  });

  it('takes no decision on other hashes than it shows, nor with a wrong password', async () => {
    const seen = await review();
    const caller = await callAs(api(), world.people.lead);
    expect(
      (await caller.post(`/reviews/${seen.id}/decision`, { ...body(seen), contentHash: 'a'.repeat(64) }))
        .status,
    ).toBe(409);
    const wrong = await caller.post(`/reviews/${seen.id}/decision`, {
      ...body(seen),
      password: 'not mine at all',
    });
    expect(wrong.status).toBe(422);
    expect(wrong.body.faults[0].field).toBe('password');
  });

  it('is open once for a version, again after it was sent back or withdrawn', async () => {
    const seen = await review();
    const caller = await callAs(api(), world.people.aerodynamicist);
    const again = () => caller.post(`/versions/${seen.version.id}/reviews`, { message: '' });
    expect((await again()).status).toBe(409);
    expect((await caller.post(`/reviews/${seen.id}/withdrawal`)).body.state).toBe('withdrawn');
    expect((await again()).status).toBe(201);
  });

  it('pins comments to stations that exist, threads replies and resolves once', async () => {
    const seen = await review();
    const caller = await callAs(api(), world.people.lead);
    const comment = await caller.post(`/reviews/${seen.id}/comments`, { text: 'Here', stationRadiusM: 2 });
    expect(comment.body.stationRadiusM).toBe(2);
    expect(
      (await caller.post(`/reviews/${seen.id}/comments`, { text: 'Nowhere', stationRadiusM: 2.5 })).status,
    ).toBe(422);
    const reply = await caller.post(`/reviews/${seen.id}/comments`, {
      text: 'Yes',
      replyTo: comment.body.id,
    });
    expect(
      (await caller.post(`/reviews/${seen.id}/comments`, { text: 'No', replyTo: reply.body.id })).status,
    ).toBe(422);
    expect((await caller.post(`/comments/${comment.body.id}/resolution`)).status).toBe(200);
    expect((await caller.post(`/comments/${comment.body.id}/resolution`)).status).toBe(409);
  });

  it('tells the leads, then the author', async () => {
    const seen = await review();
    await approve(api(), seen, world.people.lead);
    const sent = await OutboxMail.findAll({ where: { kind: ['review-asked', 'review-decided'] } });
    const about = sent
      .filter((mail) => mail.text.includes(seen.id))
      .map((mail) => `${mail.kind} ${mail.toAddress}`);
    expect(about).toContain(`review-asked ${world.people.lead.email}`);
    expect(about).toContain(`review-decided ${world.people.aerodynamicist.email}`);
  });
});

describe('a release', () => {
  it('takes the next letter and supersedes the one before; its package proves itself', async () => {
    const first = await makeRelease(api(), world.programme, world.people.aerodynamicist, world.people.lead);
    const second = await makeRelease(api(), world.programme, world.people.aerodynamicist, world.people.lead);
    expect(second.letter.charCodeAt(0)).toBe(first.letter.charCodeAt(0) + 1);
    const reader = await callAs(api(), world.people.reader);
    const before = await reader.get(`/releases/${first.id}`);
    expect(before.body.state).toBe('superseded');
    expect(before.body.supersededBy).toEqual({ id: second.id, letter: second.letter });
    const download = await reader.get(`/releases/${second.id}/package`).responseType('blob');
    const bytes = new Uint8Array(download.body as Buffer);
    expect(createHash('sha256').update(bytes).digest('hex')).toBe(second.packageSha256);
    expect(checkPackage(bytes).faults).toEqual([]);
    expect(Object.keys(unzipSync(bytes))).toContain('stations.csv');
  });

  it('is made once of an approved version by two leads at once, and never of any other', async () => {
    const approved = await makeApproved(
      api(),
      world.programme,
      world.people.aerodynamicist,
      world.people.lead,
    );
    const lead = await callAs(api(), world.people.lead);
    const release = (id: string) =>
      lead.post(`/versions/${id}/release`, { effectivity: 'From turbine 9', note: '', password: PASSWORD });
    const answers = await Promise.all([release(approved.id), release(approved.id)]);
    expect(answers.map(({ status }) => status).sort()).toEqual([201, 409]);
    expect((await release((await version()).id)).status).toBe(409);
  });

  it('leaves the audit chain whole', async () => {
    expect((await actorOf(world.people.lead)).roles.get(world.programme.id)).toBe('lead');
    expect((await verifyAudit()).holds).toBe(true);
  });
});
