import { DEFAULT_SETTINGS } from '@tipward/contract';
import type { DraftContent } from '@tipward/contract';
import { describe, expect, it } from 'vitest';
import { canonicalJson } from './canonical-json.ts';
import { checkDraft, toDraft } from './check-draft.ts';

const draft = (chordM: number | string): DraftContent => ({
  schema: 1,
  specificationIssue: 1,
  pitchDeg: '0.5',
  designTipSpeedRatio: 7,
  settings: DEFAULT_SETTINGS,
  airfoils: [],
  stations: [
    { radiusM: 1, chordM, twistDeg: 3, thicknessPct: 25, airfoil: null },
    { radiusM: '2', chordM: 0.4, twistDeg: '\u22121.5', thicknessPct: 21, airfoil: null },
  ],
});

describe('checkDraft', () => {
  it('reads cells that are numbers in text, the typographic minus included', () => {
    const { content, faults } = checkDraft(draft('0.6'));
    expect(faults).toEqual([]);
    expect(content?.pitchDeg).toBe(0.5);
    expect(content?.stations.map((s) => [s.radiusM, s.chordM, s.twistDeg])).toEqual([
      [1, 0.6, 3],
      [2, 0.4, -1.5],
    ]);
    expect(content === null ? null : checkDraft(toDraft(content)).content).toEqual(content);
  });
  it.each([
    ['1,5', 'has a decimal comma; allowed: a number with a point, such as 1.5'],
    ['NaN', 'is not a number; allowed: a number with a point, such as 1.5'],
    ['1e999', 'is too large; allowed: a finite number'],
    ['', 'is empty; allowed: a number'],
    ['0x10', 'is not a number; allowed: a number with a point, such as 1.5'],
  ])('refuses %j with field and hint', (cell, message) => {
    const { content, faults } = checkDraft(draft(cell));
    expect(content).toBeNull();
    expect(faults).toEqual([{ field: 'stations[0].chordM', value: JSON.stringify(cell), message }]);
  });
  it('reads −0 as 0', () => {
    expect(Object.is(checkDraft(draft('-0')).content?.stations[0]?.chordM, 0)).toBe(true);
  });
});

describe('canonicalJson', () => {
  it('does not depend on the order of keys', () => {
    expect(canonicalJson({ b: 1, a: [{ d: null, c: 'x' }] })).toBe('{"a":[{"c":"x","d":null}],"b":1}');
  });
  it('refuses numbers without a JSON form', () => {
    expect(() => canonicalJson({ a: NaN })).toThrow('no JSON form');
    expect(() => canonicalJson([Infinity])).toThrow('no JSON form');
  });
});
