import type { ScaleLinear } from 'd3-scale';
import { memo } from 'react';
import type { PlotLimit } from './plot-series.ts';

/** Limits across a plot: a fine hatched rule with its name. */
export const LimitLines = memo(function LimitLines({
  limits,
  y,
  left,
  right,
}: {
  limits: readonly PlotLimit[];
  y: ScaleLinear<number, number>;
  left: number;
  right: number;
}) {
  return (
    <g>
      {limits.map((limit) => (
        <g key={limit.label}>
          <line
            x1={left}
            x2={right}
            y1={y(limit.value)}
            y2={y(limit.value)}
            stroke="var(--fails)"
            strokeWidth={1}
            strokeDasharray="1 3"
          />
          <text
            x={right - 4}
            y={y(limit.value) - 3}
            textAnchor="end"
            fontSize={10}
            className="font-sans"
            fill="var(--fails)"
            stroke="var(--paper)"
            strokeWidth={3}
            paintOrder="stroke"
          >
            {limit.label}
          </text>
        </g>
      ))}
    </g>
  );
});
