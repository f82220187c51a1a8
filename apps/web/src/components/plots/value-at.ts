import type { PlotSeries } from './plot-series.ts';

/** y at x, linear between neighbouring points; null outside the points or next to a gap. */
export function valueAt(points: PlotSeries['points'], x: number): number | null {
  let low = 0;
  let high = points.length - 1;
  const first = points[low];
  const last = points[high];
  if (first === undefined || last === undefined || x < first[0] || x > last[0]) return null;
  while (high - low > 1) {
    const middle = (low + high) >> 1;
    const at = points[middle];
    if (at !== undefined && at[0] <= x) low = middle;
    else high = middle;
  }
  const left = points[low];
  const right = points[high];
  if (left === undefined || right === undefined) return null;
  if (left[0] === x) return left[1];
  if (right[0] === x) return right[1];
  if (left[1] === null || right[1] === null) return null;
  return left[1] + ((x - left[0]) / (right[0] - left[0])) * (right[1] - left[1]);
}
