import type { PlotSeries } from './plot-series.ts';
import { valueAt } from './value-at.ts';

/**
 * Every other line but bounds minus the base line, at the other line's own points; null where either is unknown.
 * Empty when the base is not among the lines.
 */
export function differencesFrom(series: readonly PlotSeries[], baseId: string | undefined): PlotSeries[] {
  const base = series.find((line) => line.id === baseId);
  if (base === undefined) return [];
  return series
    .filter((line) => line !== base && line.bound !== true)
    .map((line) => ({
      ...line,
      points: line.points.map(([x, y]) => {
        const reference = valueAt(base.points, x);
        return [x, y === null || reference === null ? null : y - reference] as const;
      }),
    }));
}
