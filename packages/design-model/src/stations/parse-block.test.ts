import fc from 'fast-check';
import { DEFAULT_SETTINGS } from '@tipward/contract';
import type { DesignContent } from '@tipward/contract';
import { describe, expect, it } from 'vitest';
import { stationsCsv } from './csv.ts';
import { parseStationBlock } from './parse-block.ts';

describe('parseStationBlock', () => {
  it('reads a spreadsheet block without a header', () => {
    const block = parseStationBlock('1.0\t0.5\t12.5\t30\n2.0\t0.4\t6\t21\tSM-21\n');
    expect(block.header).toBeNull();
    expect(block.faults).toEqual([]);
    expect(block.rows).toEqual([
      { radiusM: 1, chordM: 0.5, twistDeg: 12.5, thicknessPct: 30, airfoil: null },
      { radiusM: 2, chordM: 0.4, twistDeg: 6, thicknessPct: 21, airfoil: 'SM-21' },
    ]);
  });
  it('follows a header in any order, with a byte order mark', () => {
    const block = parseStationBlock('\uFEFFtwist [deg],radius [m],chord [m]\r\n5,1,0.5\r\n');
    expect(block.rows[0]).toMatchObject({ radiusM: 1, chordM: 0.5, twistDeg: 5 });
  });
  it('keeps one bad cell as text, names it and keeps the rest', () => {
    const block = parseStationBlock('1;0,5;12;30\n2;0.4;6;21');
    expect(block.faults).toHaveLength(1);
    expect(block.faults[0]).toMatchObject({ row: 0, column: 1, field: 'chordM', value: '"0,5"' });
    expect(block.rows[0]?.chordM).toBe('0,5');
    expect(block.rows[1]?.chordM).toBe(0.4);
  });
  it('names a number out of range', () => {
    expect(parseStationBlock('1\t3100\t5\t21').faults[0]?.message).toBe(
      'Chord is out of range; allowed: a number at least 0 and at most 20 m',
    );
  });
  it('takes 200 rows and names the rest', () => {
    const text = Array.from({ length: 250 }, (_, i) => `${1 + i}\t1\t0\t21`).join('\n');
    const block = parseStationBlock(text);
    expect(block.rows).toHaveLength(200);
    expect(block.faults.at(-1)?.message).toBe('Too many stations; allowed: at most 200');
  });
  it('never throws and gives back what stationsCsv wrote', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'binary' }), (text) => {
        parseStationBlock(text);
      }),
    );
    const cell = fc.double({ min: 0.001, max: 19, noNaN: true });
    const station = fc.record({
      radiusM: cell,
      chordM: cell,
      twistDeg: cell,
      thicknessPct: fc.double({ min: 1, max: 100, noNaN: true }),
      airfoil: fc.constantFrom(null, 'SM-21', 'A, "b"'),
    });
    fc.assert(
      fc.property(fc.array(station, { minLength: 1, maxLength: 30 }), (stations) => {
        const content: DesignContent = {
          schema: 1,
          specificationIssue: 1,
          pitchDeg: 0,
          designTipSpeedRatio: 7,
          settings: DEFAULT_SETTINGS,
          airfoils: [],
          stations,
        };
        expect(parseStationBlock(stationsCsv(content)).rows).toEqual(stations);
      }),
    );
  });
});
