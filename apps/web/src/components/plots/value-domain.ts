import { scaleLinear } from 'd3-scale';
import type { PlotSeries } from './plot-series.ts';

/**
 * Axis range that holds every value, rounded outward to ticks. A flat line gets room around it, so that rounding noise
 * does not fill the plot. No value at all: 0 to 1.
 */
export function valueDomain(
  series: readonly PlotSeries[],
  { includeZero = false, extra = [] }: { includeZero?: boolean; extra?: readonly number[] } = {},
): [number, number] {
  const values = series.flatMap((line) => line.points.flatMap(([, y]) => (y === null ? [] : [y])));
  values.push(...extra);
  if (values.length === 0) return [0, 1];
  let low = values.reduce((a, b) => Math.min(a, b));
  let high = values.reduce((a, b) => Math.max(a, b));
  if (includeZero) {
    low = Math.min(0, low);
    high = Math.max(0, high);
  }
  const room = Math.max(Math.abs(low), Math.abs(high), 1e-6) * 1e-3;
  if (high - low < room) {
    low -= room;
    high += room;
  }
  const [from = low, to = high] = scaleLinear().domain([low, high]).nice(4).domain();
  return [from, to];
}

/** Range shared by plots whose x is not the span: the union of what the lines cover. */
export function argumentDomain(series: readonly PlotSeries[]): [number, number] {
  const ends = series.flatMap((line) => {
    const first = line.points[0];
    const last = line.points.at(-1);
    return first === undefined || last === undefined ? [] : [first[0], last[0]];
  });
  if (ends.length === 0) return [0, 1];
  const low = Math.min(...ends);
  const high = Math.max(...ends);
  return high > low ? [low, high] : [low, low + 1];
}
