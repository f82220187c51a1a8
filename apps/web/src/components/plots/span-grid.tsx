import { memo } from 'react';
import { useSpanAxis } from './span-axis-context.ts';

/** Upright hairlines at the radii the ruler names, and the root and tip. */
export const SpanGrid = memo(function SpanGrid({ top, bottom }: { top: number; bottom: number }) {
  const axis = useSpanAxis();
  return (
    <g stroke="var(--rule)" strokeWidth={1}>
      {axis.scale.ticks(8).map((radiusM) => (
        <line key={radiusM} x1={axis.scale(radiusM)} x2={axis.scale(radiusM)} y1={top} y2={bottom} />
      ))}
      <line x1={axis.left} x2={axis.left} y1={top} y2={bottom} stroke="var(--ink-soft)" />
      <line x1={axis.right} x2={axis.right} y1={top} y2={bottom} stroke="var(--ink-soft)" />
    </g>
  );
});
