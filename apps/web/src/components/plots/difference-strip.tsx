import { formatDifference } from '@tipward/design-model';
import type { QuantityKind } from '@tipward/design-model';
import { scaleLinear } from 'd3-scale';
import type { ScaleLinear } from 'd3-scale';
import { memo } from 'react';
import { PlotLines } from './plot-lines.tsx';
import type { PlotSeries } from './plot-series.ts';

export const DIFFERENCE_PX = 34;

/** Largest magnitude of all differences; zero when there is none. */
function largestMagnitude(differences: readonly PlotSeries[]): number {
  let largest = 0;
  for (const line of differences)
    for (const [, y] of line.points) if (y !== null) largest = Math.max(largest, Math.abs(y));
  return largest;
}

/** The slim strip beneath a plot: each line minus the base, about a zero line, scaled to the largest difference. */
export const DifferenceStrip = memo(function DifferenceStrip({
  differences,
  x,
  top,
  quantity,
}: {
  differences: readonly PlotSeries[];
  x: ScaleLinear<number, number>;
  top: number;
  quantity: QuantityKind;
}) {
  const [left = 0, right = 0] = x.range();
  const largest = largestMagnitude(differences);
  const y = scaleLinear()
    .domain([-(largest || 1), largest || 1])
    .range([top + DIFFERENCE_PX - 3, top + 3]);
  return (
    <g data-part="difference-strip">
      <rect
        x={left}
        y={top}
        width={right - left}
        height={DIFFERENCE_PX}
        fill="var(--panel)"
        stroke="var(--rule)"
      />
      <line x1={left} x2={right} y1={y(0)} y2={y(0)} stroke="var(--ink-soft)" strokeWidth={0.75} />
      <PlotLines series={differences} x={x} y={y} bottomPx={top + DIFFERENCE_PX} labels={false} />
      <text
        x={left - 6}
        y={y(0) + 3.5}
        textAnchor="end"
        fontSize={10.5}
        className="font-mono"
        fill="var(--ink-soft)"
      >
        {largest === 0 ? '±0' : `±${formatDifference(quantity, largest).replace('+', '')}`}
      </text>
      <text x={right + 5} y={y(0) + 3.5} fontSize={10.5} className="font-sans" fill="var(--ink-soft)">
        Δ
      </text>
    </g>
  );
});
