import type { ScaleLinear } from 'd3-scale';
import { memo } from 'react';

/** The stations as given, on a curve drawn between them. */
export const StationDots = memo(function StationDots({
  stations,
  x,
  y,
}: {
  stations: readonly (readonly [number, number])[];
  x: ScaleLinear<number, number>;
  y: ScaleLinear<number, number>;
}) {
  return (
    <g fill="var(--series-1)">
      {stations.map(([radiusM, value], i) => (
        <circle key={i} cx={x(radiusM)} cy={y(value)} r={2} />
      ))}
    </g>
  );
});
