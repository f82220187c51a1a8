import { describe, expect, it } from 'vitest';
import { sampleDraft } from '../test/sample-draft.ts';
import { setCellText } from './edit-content.ts';
import type { StudioAction, StudioState } from './studio-reducer.ts';
import { startState, studioReducer } from './studio-reducer.ts';

const chord = (text: string, mergeKey?: string): StudioAction => ({
  type: 'change',
  label: 'Chord at station 1',
  change: setCellText(0, 'chordM', text),
  ...(mergeKey === undefined ? {} : { mergeKey }),
});
const run = (actions: StudioAction[], from: StudioState = startState(sampleDraft())) =>
  actions.reduce(studioReducer, from);
const chordOf = (state: StudioState) => state.content.stations[0]?.chordM;

describe('studioReducer', () => {
  it('undoes and redoes named steps', () => {
    const edited = run([chord('0.5'), chord('0.6')]);
    expect(edited.past.map((step) => step.label)).toEqual(['Chord at station 1', 'Chord at station 1']);
    const back = run([{ type: 'undo' }, { type: 'undo' }, { type: 'undo' }], edited);
    expect(chordOf(back)).toBe(0.8);
    expect(chordOf(run([{ type: 'redo' }], back))).toBe(0.5);
    expect(chordOf(run([{ type: 'redo' }, { type: 'redo' }, { type: 'redo' }], back))).toBe(0.6);
  });
  it('drops what was undone once something else is done', () => {
    const state = run([chord('0.5'), { type: 'undo' }, chord('0.7')]);
    expect(state.future).toEqual([]);
    expect(chordOf(run([{ type: 'redo' }], state))).toBe(0.7);
  });
  it('holds the keys of one cell together as one step', () => {
    const state = run([chord('0', 'edit-1'), chord('0.4', 'edit-1'), chord('0.45', 'edit-1')]);
    expect(state.past).toHaveLength(1);
    expect(chordOf(state)).toBe(0.45);
    expect(chordOf(run([{ type: 'undo' }], state))).toBe(0.8);
  });
  it('takes a cancelled edit back without a trace, and only that one', () => {
    const state = run([chord('0.5'), chord('9', 'edit-2'), { type: 'cancel', mergeKey: 'edit-2' }]);
    expect(chordOf(state)).toBe(0.5);
    expect(state.past).toHaveLength(1);
    expect(state.future).toEqual([]);
    expect(run([{ type: 'cancel', mergeKey: 'other' }], state)).toBe(state);
  });
  it('makes no step of a change that changes nothing', () => {
    const start = startState(sampleDraft());
    expect(studioReducer(start, { type: 'change', label: 'Nothing', change: (content) => content })).toBe(
      start,
    );
  });
});
