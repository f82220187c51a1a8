import { describe, expect, it } from 'vitest';
import { faultsOf } from '../values/fault.ts';
import type { DesignContent, Station } from './content.ts';
import { DEFAULT_SETTINGS, designContent } from './content.ts';

const station = (radiusM: number, over: Partial<Station> = {}): Station => ({
  radiusM,
  chordM: 0.5,
  twistDeg: 2,
  thicknessPct: 21,
  airfoil: null,
  ...over,
});

const content = (stations: Station[]): DesignContent => ({
  schema: 1,
  specificationIssue: 1,
  pitchDeg: 0,
  designTipSpeedRatio: 7,
  settings: DEFAULT_SETTINGS,
  airfoils: [
    { name: 'SM-21', airfoilId: '6b1f4d0e-8f0a-4c56-9a37-1f2a4b7c9d10', polarSetHash: 'a'.repeat(64) },
  ],
  stations,
});

function faults(stations: Station[]) {
  const input = content(stations);
  const result = designContent.safeParse(input);
  return result.success
    ? []
    : faultsOf(result.error, input).map((fault) => `${fault.field}: ${fault.message}`);
}

describe('a design’s content', () => {
  it('takes 2 and 200 stations, refuses 1 and 201', () => {
    const many = (count: number) => Array.from({ length: count }, (_, i) => station(1 + i * 0.1));
    expect(faults(many(2))).toEqual([]);
    expect(faults(many(200))).toEqual([]);
    expect(faults(many(1))).toEqual(['stations: Too few stations; allowed: 2 to 200']);
    expect(faults(many(201))).toEqual(['stations: Too many stations; allowed: 2 to 200']);
  });
  it('names stations that are out of order or doubled', () => {
    expect(faults([station(1), station(3), station(2), station(2)])).toEqual([
      'stations[2].radiusM: Radius is out of order; allowed: above 3 m, the station before',
      'stations[3].radiusM: Radius stands twice; allowed: each radius once, ascending',
    ]);
  });
  it('names an airfoil the design does not have', () => {
    expect(faults([station(1, { airfoil: 'SM-21' }), station(2, { airfoil: 'XX' })])).toEqual([
      "stations[1].airfoil: Airfoil is not among the design's airfoils; allowed: SM-21 or blended",
    ]);
  });
});
