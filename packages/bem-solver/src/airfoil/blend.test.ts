import { describe, expect, it } from 'vitest';
import { blendPolars, interpolateReynolds } from './blend.ts';

const thin = { alphaDeg: [-10, 0, 10], cl: [-1, 0, 1], cd: [0.02, 0.01, 0.02], cm: [0, -0.1, 0] };
const thick = { alphaDeg: [-10, 5, 10], cl: [-0.7, 0.5, 0.8], cd: [0.04, 0.02, 0.05], cm: [0, -0.2, 0] };

describe('blendPolars', () => {
  it('stands on the union of the angles and gives either table at weight 0 and 1', () => {
    const a = blendPolars(thin, thick, 0);
    expect(Array.from(a.alphaDeg)).toEqual([-10, 0, 5, 10]);
    expect(Array.from(a.cl)).toEqual([-1, 0, 0.5, 1]);
    const b = blendPolars(thin, thick, 1);
    expect(b.cl[1]).toBeCloseTo(-0.7 + (10 / 15) * 1.2, 12);
    expect(b.cd[2]).toBe(0.02);
  });
  it('is linear in the weight, the moment included', () => {
    const half = blendPolars(thin, thick, 0.25);
    expect(half.cl[3]).toBeCloseTo(0.75 * 1 + 0.25 * 0.8, 12);
    expect(half.cm?.[2]).toBeCloseTo(0.75 * -0.05 + 0.25 * -0.2, 12);
    const { cm: _cm, ...bare } = thick;
    expect(blendPolars(thin, bare, 0.5).cm).toBeUndefined();
  });
  it('refuses a weight outside 0 to 1', () => {
    expect(() => blendPolars(thin, thick, 1.1)).toThrow('weightB is 1.1');
    expect(() => blendPolars(thin, thick, NaN)).toThrow('weightB');
  });
});

describe('interpolateReynolds', () => {
  const set = [
    { reynolds: 1e5, table: thin },
    { reynolds: 1e7, table: thick },
  ];
  it('is linear in log Re', () => {
    const { table, outside } = interpolateReynolds(set, 1e6);
    expect(outside).toBe(false);
    expect(table.cl[3]).toBeCloseTo(0.9, 12);
  });
  it('keeps the nearest end outside its range, and says so', () => {
    expect(interpolateReynolds(set, 5e4)).toEqual({ table: thin, outside: true });
    expect(interpolateReynolds(set, 2e7)).toEqual({ table: thick, outside: true });
    expect(interpolateReynolds(set, 1e5).outside).toBe(false);
  });
  it('refuses an empty or unordered set and a Reynolds number that is none', () => {
    expect(() => interpolateReynolds([], 1e6)).toThrow('set is empty');
    expect(() => interpolateReynolds(set.toReversed(), 1e6)).toThrow('set[1].reynolds');
    expect(() => interpolateReynolds(set, 0)).toThrow('reynolds is 0');
  });
});
