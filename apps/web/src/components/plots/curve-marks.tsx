import type { ScaleLinear } from 'd3-scale';
import { memo } from 'react';
import type { PlotMark } from './plot-series.ts';
import { seriesColor } from './plot-series.ts';

/** Named points on curves, such as the maximum: a diamond with its numbers. */
export const CurveMarks = memo(function CurveMarks({
  marks,
  x,
  y,
}: {
  marks: readonly PlotMark[];
  x: ScaleLinear<number, number>;
  y: ScaleLinear<number, number>;
}) {
  return (
    <g>
      {marks.map((mark) => (
        <g key={`${mark.label}-${mark.x}`}>
          <path
            d={`M${x(mark.x)} ${y(mark.y) - 5}l5 5l-5 5l-5 -5z`}
            fill="var(--paper)"
            stroke={seriesColor(mark.colorIndex)}
            strokeWidth={1.5}
          />
          <text
            x={x(mark.x)}
            y={y(mark.y) + 20}
            textAnchor="middle"
            fontSize={11}
            className="font-mono"
            fill="var(--ink)"
            stroke="var(--paper)"
            strokeWidth={3}
            paintOrder="stroke"
          >
            {mark.label}
          </text>
        </g>
      ))}
    </g>
  );
});
