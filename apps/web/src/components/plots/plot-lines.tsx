import type { ScaleLinear } from 'd3-scale';
import { line } from 'd3-shape';
import { memo } from 'react';
import { endLabels } from './end-labels.ts';
import type { PlotSeries } from './plot-series.ts';
import { seriesColor, seriesDash } from './plot-series.ts';

/** The lines of a plot with their names at their ends. What is in hand is drawn last, over what it is compared with. */
export const PlotLines = memo(function PlotLines({
  series,
  x,
  y,
  bottomPx,
  labels = true,
}: {
  series: readonly PlotSeries[];
  x: ScaleLinear<number, number>;
  y: ScaleLinear<number, number>;
  bottomPx: number;
  labels?: boolean;
}) {
  const path = line<readonly [number, number | null]>()
    .defined((point) => point[1] !== null)
    .x((point) => x(point[0]))
    .y((point) => y(point[1] ?? 0));
  const drawn = series.toSorted((a, b) => Number(a.kind === 'solid') - Number(b.kind === 'solid'));
  return (
    <g>
      {drawn.map((each) => (
        <path
          key={each.id}
          data-series={each.id}
          d={path(each.points) ?? ''}
          fill="none"
          stroke={seriesColor(each.colorIndex)}
          strokeWidth={each.kind === 'solid' ? 1.75 : 1.25}
          strokeDasharray={seriesDash(each)}
          className="motion-safe:transition-[d] motion-safe:duration-[120ms]"
        />
      ))}
      {labels &&
        endLabels(series, x, y, bottomPx).map((label) => (
          <text
            key={label.id}
            x={label.x + 5}
            y={label.y + 3.5}
            fontSize={10.5}
            className="font-sans"
            fill={seriesColor(label.colorIndex)}
          >
            {label.label}
          </text>
        ))}
    </g>
  );
});
