import type { ScaleLinear } from 'd3-scale';
import type { PlotSeries } from './plot-series.ts';
import { seriesColor } from './plot-series.ts';
import { valueAt } from './value-at.ts';

/** The cursor's line through a plot with a dot on every curve it meets. */
export function CursorLayer({
  cursorX,
  series,
  x,
  y,
  top,
  bottom,
}: {
  cursorX: number | null;
  series: readonly PlotSeries[];
  x: ScaleLinear<number, number>;
  y: ScaleLinear<number, number>;
  top: number;
  bottom: number;
}) {
  if (cursorX === null) return null;
  const px = x(cursorX);
  return (
    <g data-part="cursor">
      <line x1={px} x2={px} y1={top} y2={bottom} stroke="var(--ink)" strokeWidth={0.75} />
      {series.map((line) => {
        const value = valueAt(line.points, cursorX);
        return value === null ? null : (
          <circle
            key={line.id}
            cx={px}
            cy={y(value)}
            r={3}
            fill={line.kind === 'solid' ? seriesColor(line.colorIndex) : 'var(--paper)'}
            stroke={seriesColor(line.colorIndex)}
            strokeWidth={1.25}
          />
        );
      })}
    </g>
  );
}
