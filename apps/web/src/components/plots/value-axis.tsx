import type { ScaleLinear } from 'd3-scale';
import { memo } from 'react';

/** Hairlines and numbers of the vertical axis. */
export const ValueAxis = memo(function ValueAxis({
  y,
  left,
  right,
  ticks,
  format,
}: {
  y: ScaleLinear<number, number>;
  left: number;
  right: number;
  ticks: number;
  format?: (value: number) => string;
}) {
  const write = format ?? y.tickFormat(ticks);
  return (
    <g>
      {y.ticks(ticks).map((value) => (
        <g key={value}>
          <line x1={left} x2={right} y1={y(value)} y2={y(value)} stroke="var(--rule)" strokeWidth={1} />
          <text
            x={left - 6}
            y={y(value) + 3.5}
            textAnchor="end"
            fontSize={10.5}
            className="font-mono"
            fill="var(--ink-soft)"
          >
            {write(value)}
          </text>
        </g>
      ))}
    </g>
  );
});
