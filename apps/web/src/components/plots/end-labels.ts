import type { ScaleLinear } from 'd3-scale';
import type { PlotSeries } from './plot-series.ts';

export interface EndLabel {
  readonly id: string;
  readonly label: string;
  readonly colorIndex: number;
  readonly x: number;
  readonly y: number;
}

const LINE_PX = 12;

/** Labels at the lines' ends, pushed apart so that none covers another. */
export function endLabels(
  series: readonly PlotSeries[],
  x: ScaleLinear<number, number>,
  y: ScaleLinear<number, number>,
  bottomPx: number,
): EndLabel[] {
  const wanted = series
    .flatMap((line) => {
      const last = line.points.findLast((point) => point[1] !== null);
      if (last === undefined || last[1] === null) return [];
      return [{ id: line.id, label: line.label, colorIndex: line.colorIndex, x: x(last[0]), y: y(last[1]) }];
    })
    .sort((a, b) => a.y - b.y);
  let floor = -Infinity;
  const pushed = wanted.map((label) => {
    floor = Math.max(label.y, floor + LINE_PX);
    return { ...label, y: floor };
  });
  const overshoot = Math.max(0, (pushed.at(-1)?.y ?? 0) - bottomPx);
  return pushed.map((label) => ({ ...label, y: label.y - overshoot }));
}
