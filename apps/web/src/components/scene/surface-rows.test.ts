import { describe, expect, it } from 'vitest';
import { planformEdges, rowAt, surfaceIndex, writeSection } from './surface-rows.ts';

// Two columns, three rows at r = 1, 2, 4; y = ±chord/2.
const surface = {
  rows: 3,
  columns: 2,
  positions: new Float32Array([1, 0.5, 0, 1, -0.5, 0, 2, 1, 0, 2, -1, 0, 4, 0.25, 2, 4, -0.25, 2]),
};

describe('rows of a blade surface', () => {
  it('finds a radius between rows, none off the blade', () => {
    expect(rowAt(surface, 3)).toEqual({ row: 1, share: 0.5 });
    expect(rowAt(surface, 4)).toEqual({ row: 1, share: 1 });
    expect(rowAt(surface, 0.9)).toBeNull();
    expect(rowAt(surface, NaN)).toBeNull();
  });
  it('writes the section half way between two rows', () => {
    const target = new Float32Array(6);
    expect(writeSection(surface, 3, target)).toBe(true);
    expect([...target]).toEqual([3, 0.625, 1, 3, -0.625, 1]);
    expect(writeSection(surface, 5, target)).toBe(false);
  });
  it('joins neighbours into two triangles a cell', () => {
    expect([...surfaceIndex(3, 2)]).toEqual([0, 2, 1, 1, 2, 3, 2, 4, 3, 3, 4, 5]);
  });
  it('reads both edges of the planform', () => {
    expect(planformEdges(surface).map(({ leadingM, trailingM }) => leadingM - trailingM)).toEqual([
      1, 2, 0.5,
    ]);
  });
});
