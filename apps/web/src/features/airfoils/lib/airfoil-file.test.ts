import { describe, expect, it } from 'vitest';
import { readAirfoilFile } from './airfoil-file.ts';

const outline = [
  [1, 0],
  [0.5, 0.06],
  [0, 0],
  [0.5, -0.06],
  [1, 0],
];
const polar = {
  reynolds: 1e6,
  surfaceState: 'clean',
  source: 'test',
  alphaDeg: [-5, 0, 5],
  cl: [-0.5, 0, 0.5],
  cd: [0.01, 0.008, 0.01],
  measuredFromDeg: null,
  measuredToDeg: null,
};
const whole = { name: 'T-12', thicknessPct: 12, note: 'test', outline, polars: [polar] };

describe('readAirfoilFile', () => {
  it('takes a whole one', () => {
    expect(readAirfoilFile(JSON.stringify(whole))).toEqual({ airfoil: whole, faults: [] });
  });

  it('names every fault of a bad one', () => {
    const bad = { ...whole, thicknessPct: 0, polars: [{ ...polar, cl: [0, 1], alphaDeg: [0, 0, 5] }] };
    const { airfoil, faults } = readAirfoilFile(JSON.stringify(bad));
    expect(airfoil).toBeNull();
    expect(faults.map(({ field }) => field)).toEqual([
      'thicknessPct',
      'polars[0].cl',
      'polars[0].alphaDeg[1]',
    ]);
  });

  it('says that text is no JSON', () => {
    expect(readAirfoilFile('alpha,cl,cd').faults[0]?.message).toContain('is not JSON');
  });
});
