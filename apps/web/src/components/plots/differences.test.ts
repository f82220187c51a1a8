import { describe, expect, it } from 'vitest';
import { differencesFrom } from './differences.ts';
import type { PlotSeries } from './plot-series.ts';

const line = (id: string, points: PlotSeries['points']): PlotSeries => ({
  id,
  label: id,
  points,
  kind: 'solid',
  colorIndex: 0,
});

describe('differencesFrom', () => {
  const base = line('v1', [
    [0, 0],
    [2, 2],
  ]);
  const other = line('v2', [
    [0, 1],
    [1, 1],
    [2, null],
    [3, 5],
  ]);
  it('subtracts the base at the points of the other line', () => {
    expect(differencesFrom([base, other], 'v1').map(({ id, points }) => [id, points])).toEqual([
      [
        'v2',
        [
          [0, 1],
          [1, 0],
          [2, null],
          [3, null],
        ],
      ],
    ]);
  });
  it('is empty without a base', () => {
    expect(differencesFrom([base, other], 'v9')).toEqual([]);
    expect(differencesFrom([base, other], undefined)).toEqual([]);
  });
});
