import { describe, expect, it } from 'vitest';
import { coefficientsAt, compilePolar, extendViterna, viternaAt, viternaConstants } from '../../src/index.ts';
import { holds, largestError } from '../print-error.ts';

/** α, cl, cd of the extension matched at 15° (cl 1.2, cd 0.03), aspect ratio 10: see SOURCE.md. */
const TABLE: readonly (readonly [number, number, number])[] = [
  [15, 1.2, 0.03],
  [20, 1.04305527, 0.09601984],
  [30, 0.923716, 0.27192094],
  [45, 0.81712375, 0.60370237],
  [60, 0.62885561, 0.93829816],
  [75, 0.33938125, 1.1884704],
  [90, 0, 1.29],
];

describe('Viterna and Corrigan 1981', () => {
  it('lift and drag from the matching angle to 90°', () => {
    const constants = viternaConstants(15, 1.2, 0.03, 10);
    const solved = TABLE.map(([alpha]) => viternaAt(constants, alpha));
    holds(
      'cl',
      largestError(
        solved.map((s) => s.cl),
        TABLE.map((row) => row[1]),
      ),
      1e-8,
    );
    holds(
      'cd',
      largestError(
        solved.map((s) => s.cd),
        TABLE.map((row) => row[2]),
      ),
      1e-8,
    );
  });
  it('keeps the table it extends, ascends, closes at ±180° and has drag everywhere', () => {
    const table = { alphaDeg: [-10, 0, 15], cl: [-0.8, 0.2, 1.2], cd: [0.02, 0.008, 0.03] };
    const whole = extendViterna(table, { aspectRatio: 10 });
    const polar = compilePolar(whole);
    table.alphaDeg.forEach((alpha, i) => {
      expect(coefficientsAt(polar, (alpha * Math.PI) / 180).cl).toBeCloseTo(table.cl[i] ?? NaN, 12);
    });
    const last = whole.alphaDeg.length - 1;
    expect([whole.alphaDeg[0], whole.alphaDeg[last]]).toEqual([-180, 180]);
    expect(whole.cl[0]).toBeCloseTo(whole.cl[last] ?? NaN, 12);
    expect(whole.cd[0]).toBeCloseTo(whole.cd[last] ?? NaN, 12);
    expect(Math.min(...Array.from(whole.cd))).toBeGreaterThan(0);
  });
});
