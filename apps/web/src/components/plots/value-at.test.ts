import { describe, expect, it } from 'vitest';
import { valueAt } from './value-at.ts';

const points = [
  [1, 10],
  [2, 20],
  [3, null],
  [4, 40],
] as const;

describe('valueAt', () => {
  it('is linear between points and exact on them', () => {
    expect(valueAt(points, 1.25)).toBe(12.5);
    expect(valueAt(points, 2)).toBe(20);
    expect(valueAt(points, 4)).toBe(40);
  });
  it('is unknown outside the points and beside a gap', () => {
    expect(valueAt(points, 0.99)).toBeNull();
    expect(valueAt(points, 4.01)).toBeNull();
    expect(valueAt(points, 2.5)).toBeNull();
    expect(valueAt(points, 3)).toBeNull();
    expect(valueAt([], 1)).toBeNull();
  });
});
