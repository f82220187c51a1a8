import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import type { DraftContent } from '@tipward/contract';
import { ApiProblem, unreachable } from '../../../lib/api/api-problem.ts';
import { sampleDraft } from '../test/sample-draft.ts';
import { Autosaver } from './autosaver.ts';
import { draftDifferences } from './draft-differences.ts';
import { setCellText } from './edit-content.ts';
import { KeptEdits } from './kept-edits.ts';
import type { EditStorage } from './kept-edits.ts';

function memoryStorage(): EditStorage {
  const held = new Map<string, string>();
  return {
    getItem: (key) => held.get(key) ?? null,
    setItem: (key, value) => void held.set(key, value),
    removeItem: (key) => void held.delete(key),
  };
}

const start = sampleDraft();
const mine = setCellText(0, 'chordM', '0.5')(start);
const theirs = setCellText(1, 'twistDeg', '9')(start);
const stale = () =>
  new ApiProblem({
    type: 'about:blank',
    title: 'Stale',
    status: 412,
    code: 'stale',
    current: { content: theirs, updatedAt: '2026-01-01T10:00:00Z' },
    currentETag: '"7"',
  });

function saverOf(save: (content: DraftContent, etag: string) => Promise<{ etag: string }>) {
  const kept = new KeptEdits(memoryStorage(), 'd1');
  return { kept, saver: new Autosaver({ etag: '"3"', save, kept, now: () => '2026-01-01T12:00:00Z' }) };
}

beforeEach(() => {
  vi.useFakeTimers();
});
afterEach(() => {
  vi.useRealTimers();
});

describe('Autosaver', () => {
  it('saves once typing pauses for 0.8 s, on the ETag it has, and then on the new one', async () => {
    const save = vi.fn(() => Promise.resolve({ etag: '"4"' }));
    const { saver, kept } = saverOf(save);
    saver.edit(theirs);
    await vi.advanceTimersByTimeAsync(500);
    saver.edit(mine);
    expect(saver.getState().kind).toBe('waiting');
    expect(kept.kept()?.content).toEqual(mine);
    await vi.advanceTimersByTimeAsync(799);
    expect(save).not.toHaveBeenCalled();
    await vi.advanceTimersByTimeAsync(1);
    expect(save.mock.calls).toEqual([[mine, '"3"']]);
    expect(saver.getState().kind).toBe('saved');
    expect(kept.kept()).toBeNull();
    saver.edit(theirs);
    await saver.flush();
    expect(save.mock.calls[1]).toEqual([theirs, '"4"']);
  });
  it('saves again what was typed while it saved', async () => {
    const answers: ((value: { etag: string }) => void)[] = [];
    const save = vi.fn(() => new Promise<{ etag: string }>((resolve) => answers.push(resolve)));
    const { saver } = saverOf(save);
    saver.edit(theirs);
    await vi.advanceTimersByTimeAsync(800);
    saver.edit(mine);
    answers[0]?.({ etag: '"4"' });
    await vi.advanceTimersByTimeAsync(800);
    expect(save.mock.calls).toEqual([
      [theirs, '"3"'],
      [mine, '"4"'],
    ]);
  });
  it('keeps edits here while offline and saves them when it can', async () => {
    const save = vi.fn(() => Promise.resolve({ etag: '"4"' })).mockRejectedValueOnce(unreachable());
    const { saver, kept } = saverOf(save);
    saver.edit(mine);
    await vi.advanceTimersByTimeAsync(800);
    expect(saver.getState()).toEqual({ kind: 'offline', keptHere: true });
    expect(kept.kept()).toEqual({ content: mine, etag: '"3"', at: '2026-01-01T12:00:00Z' });
    await vi.advanceTimersByTimeAsync(2000);
    expect(saver.getState().kind).toBe('saved');
  });
  it('says so when nothing can be kept here', async () => {
    const full: EditStorage = {
      ...memoryStorage(),
      setItem: () => {
        throw new DOMException('full', 'QuotaExceededError');
      },
    };
    const saver = new Autosaver({
      etag: '"3"',
      save: () => Promise.reject(unreachable()),
      kept: new KeptEdits(full, 'd1'),
    });
    saver.edit(mine);
    await vi.advanceTimersByTimeAsync(800);
    expect(saver.getState()).toEqual({ kind: 'offline', keptHere: false });
  });
  it('stops and shows why when the server refuses', async () => {
    const problem = new ApiProblem({
      type: 'about:blank',
      title: 'Draft not found',
      status: 404,
      code: 'not-found',
    });
    const save = vi.fn(() => Promise.reject(problem));
    const { saver } = saverOf(save);
    saver.edit(mine);
    await vi.advanceTimersByTimeAsync(60_000);
    expect(saver.getState()).toEqual({ kind: 'refused', message: 'Draft not found', keptHere: true });
    expect(save).toHaveBeenCalledTimes(1);
  });
});

describe('saving at once', () => {
  it('sends one request when it is asked twice while another runs', async () => {
    const answers: ((value: { etag: string }) => void)[] = [];
    const save = vi.fn(() => new Promise<{ etag: string }>((resolve) => answers.push(resolve)));
    const { saver } = saverOf(save);
    saver.edit(theirs);
    await vi.advanceTimersByTimeAsync(800);
    saver.edit(mine);
    const both = [saver.flush(), saver.flush()];
    answers[0]?.({ etag: '"4"' });
    await vi.advanceTimersByTimeAsync(0);
    expect(save).toHaveBeenCalledTimes(2);
    answers[1]?.({ etag: '"5"' });
    await Promise.all(both);
    expect(save).toHaveBeenCalledTimes(2);
    expect(saver.currentETag()).toBe('"5"');
  });
});

describe('a conflict', () => {
  async function inConflict() {
    const save = vi.fn(() => Promise.resolve({ etag: '"8"' })).mockRejectedValueOnce(stale());
    const made = saverOf(save);
    made.saver.edit(mine);
    await vi.advanceTimersByTimeAsync(800);
    return { ...made, save };
  }
  it('shows both and saves neither until a person chooses', async () => {
    const { saver, save, kept } = await inConflict();
    const state = saver.getState();
    expect(state).toMatchObject({ kind: 'conflict', storedETag: '"7"' });
    expect(state.kind === 'conflict' && draftDifferences(mine, state.stored.content)).toEqual([
      { where: 'Station 1 · Chord, m', mine: '0.5', theirs: '0.8' },
      { where: 'Station 2 · Twist, °', mine: '10', theirs: '9' },
    ]);
    await vi.advanceTimersByTimeAsync(60_000);
    expect(save).toHaveBeenCalledTimes(1);
    expect(kept.kept()?.content).toEqual(mine);
  });
  it('with mine: saves it on the stored ETag and sets theirs aside', async () => {
    const { saver, save, kept } = await inConflict();
    saver.resolve('mine');
    await vi.advanceTimersByTimeAsync(0);
    expect(save.mock.calls[1]).toEqual([mine, '"7"']);
    expect(saver.getState().kind).toBe('saved');
    expect(kept.allSetAside().map((edit) => edit.content)).toEqual([theirs]);
  });
  it('with theirs: saves nothing, goes on from the stored ETag and sets mine aside', async () => {
    const { saver, save, kept } = await inConflict();
    saver.resolve('theirs');
    expect(saver.getState().kind).toBe('saved');
    expect(kept.allSetAside().map((edit) => edit.content)).toEqual([mine]);
    expect(kept.kept()).toBeNull();
    saver.edit(theirs);
    await vi.advanceTimersByTimeAsync(800);
    expect(save.mock.calls[1]).toEqual([theirs, '"7"']);
  });
});
