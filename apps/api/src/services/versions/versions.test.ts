import { toDraft } from '@tipward/design-model';
import type { DraftContent } from '@tipward/contract';
import { beforeAll, describe, expect, it } from 'vitest';
import { makeWorld, type World } from '../../../test/rights/world.ts';
import { callAs } from '../../../test/sign-in.ts';
import { useTestApi } from '../../../test/test-api.ts';
import { makeNextVersion, makeVersion, startWork } from '../../../test/work.ts';

const api = useTestApi();
let world: World;
beforeAll(async () => {
  world = await makeWorld(api());
});

const author = () => callAs(api(), world.people.aerodynamicist);
const start = () => startWork(api(), world.programme, world.people.aerodynamicist);

/** Stores a content in a fresh draft and asks for a version of it. */
async function saveWith(change: (content: DraftContent) => DraftContent) {
  const caller = await author();
  const draft = await start();
  const stored = await caller.put(`/drafts/${draft.id}`, { content: change(draft.content) }, '"1"');
  const answer = await caller.post(`/drafts/${draft.id}/versions`, { note: 'Try' }).set('If-Match', '"2"');
  return { stored, answer, draft };
}

type Station = DraftContent['stations'][number];
const withStations = (make: (first: Station) => Station[]) => (content: DraftContent) => {
  const [first] = content.stations;
  if (first === undefined) throw new Error('the draft has no station');
  return { ...content, stations: make(first) };
};

describe('a draft', () => {
  it('is kept once of two saves from the same revision; the loser is shown what stands', async () => {
    const caller = await author();
    const draft = await start();
    const save = (pitchDeg: number) =>
      caller.put(`/drafts/${draft.id}`, { content: { ...draft.content, pitchDeg } }, '"1"');
    const answers = await Promise.all([save(1), save(2)]);
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 412]);
    const lost = answers.find(({ status }) => status === 412);
    expect(lost?.body.currentETag).toBe('"2"');
    expect([1, 2]).toContain(lost?.body.current.content.pitchDeg);
  });

  it('needs the state it edits to be named', async () => {
    const caller = await author();
    const draft = await start();
    expect((await caller.put(`/drafts/${draft.id}`, { content: draft.content })).status).toBe(428);
  });

  it('keeps what cannot be a number, but no version is made of it: every fault at once', async () => {
    const { stored, answer, draft } = await saveWith((content) => ({
      ...content,
      stations: content.stations.map((station, i) => ({
        ...station,
        chordM: ['1,5', 'NaN', '', 0.3][i] ?? 0.3,
      })),
    }));
    expect(stored.status).toBe(200);
    expect(answer.status).toBe(422);
    expect(answer.body.faults.map((fault: { field: string }) => fault.field)).toEqual([
      'stations[0].chordM',
      'stations[1].chordM',
      'stations[2].chordM',
    ]);
    expect((await (await author()).get(`/drafts/${draft.id}`)).status).toBe(200);
  });

  it.each([
    ['one station', withStations((first) => [first]), /Too few stations/u],
    [
      '201 stations',
      withStations((first) => Array.from({ length: 201 }, (_, i) => ({ ...first, radiusM: 0.6 + i * 0.03 }))),
      /Too many stations/u,
    ],
    [
      'stations out of order',
      withStations((first) => [first, { ...first, radiusM: 5 }, { ...first, radiusM: 4 }]),
      /out of order/u,
    ],
    [
      'a doubled station',
      withStations((first) => [first, { ...first, radiusM: 5 }, { ...first, radiusM: 5 }]),
      /stands twice/u,
    ],
    [
      'a station beyond the tip',
      withStations((first) => [first, { ...first, radiusM: 50 }]),
      /outside the blade/u,
    ],
  ])('refuses %s', async (_, change, message) => {
    const { stored, answer } = await saveWith(change);
    const refused = stored.status === 200 ? answer : stored;
    expect(refused.status).toBe(422);
    expect(JSON.stringify(refused.body.faults)).toMatch(message);
  });

  it('takes 200 stations', async () => {
    const { answer } = await saveWith(
      withStations((first) =>
        Array.from({ length: 200 }, (_, i) => ({ ...first, radiusM: Number((0.6 + i * 0.035).toFixed(3)) })),
      ),
    );
    expect(answer.status, JSON.stringify(answer.body)).toBe(201);
  });

  it('refuses 1e999, which JSON reads as infinity', async () => {
    const caller = await author();
    const draft = await start();
    const text = JSON.stringify({ content: draft.content }).replace(/"pitchDeg":[^,]+/u, '"pitchDeg":1e999');
    const answer = await caller
      .send('put', `/drafts/${draft.id}`)
      .set('If-Match', '"1"')
      .set('Content-Type', 'application/json')
      .send(text);
    expect(answer.status).toBe(422);
    expect(answer.body.faults[0].field).toBe('content.pitchDeg');
  });
});

describe('versions', () => {
  it('are numbered without gap or double when two are saved at once', async () => {
    const v1 = await makeVersion(api(), world.programme, world.people.aerodynamicist);
    const change = (by: number) =>
      makeNextVersion(api(), v1, world.people.aerodynamicist, (content) => ({ ...content, pitchDeg: by }));
    const [a, b] = await Promise.all([change(1), change(2)]);
    expect([a.number, b.number].sort()).toEqual([2, 3]);
    expect(a.parentId).toBe(v1.id);
    expect(a.changeSummary.join(' ')).toContain('pitchDeg: 0 →');
  });

  it('are refused where nothing changed', async () => {
    const v1 = await makeVersion(api(), world.programme, world.people.aerodynamicist);
    await expect(
      makeNextVersion(api(), v1, world.people.aerodynamicist, (content) => content),
    ).rejects.toThrow(/Nothing differs from v1/u);
  });

  it('carry the evaluation that evaluating the same content gives, bit for bit', async () => {
    const v1 = await makeVersion(api(), world.programme, world.people.aerodynamicist);
    const answer = await (
      await author()
    ).post(`/programmes/${world.programme.id}/evaluations`, { content: v1.content });
    expect(answer.body).toEqual(v1.evaluation);
  });

  it('close the draft they were made of', async () => {
    const draft = await start();
    const caller = await author();
    const saved = await caller.post(`/drafts/${draft.id}/versions`, { note: 'First' }).set('If-Match', '"1"');
    expect(saved.status).toBe(201);
    expect((await caller.get(`/drafts/${draft.id}`)).status).toBe(404);
    expect(toDraft(saved.body.content).stations).toEqual(draft.content.stations);
  });
});

describe('names of designs', () => {
  const create = async (name: string) =>
    (await author()).post(`/programmes/${world.programme.id}/designs`, {
      name,
      start: { kind: 'stations', airfoilIds: [], stations: [] },
    });

  it.each(['Blade "A" & <b>', 'Flügel 🌬️', 'ריש־רוח', "'; DROP TABLE designs; --"])(
    'keep %s',
    async (name) => {
      const answer = await create(name);
      expect(answer.status).toBe(201);
      expect(answer.body.design.name).toBe(name);
      expect((await create(name)).status).toBe(409);
    },
  );
  it('are refused at 10,000 characters, with what is allowed', async () => {
    const answer = await create('x'.repeat(10_000));
    expect(answer.status).toBe(422);
    expect(answer.body.faults[0].message).toContain('allowed: text of 1 to 120 characters');
  });
});
