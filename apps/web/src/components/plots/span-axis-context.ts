import { scaleLinear } from 'd3-scale';
import type { ScaleLinear } from 'd3-scale';
import { createContext, use } from 'react';

/** The pixel axis everything spanwise on one screen shares: root at the left edge, tip at the right. */
export interface SpanAxisValue {
  readonly hubRadiusM: number;
  readonly tipRadiusM: number;
  /** Width of the whole strip, margins included (px). */
  readonly width: number;
  readonly left: number;
  readonly right: number;
  /** Radius (m) to px from the left edge of the strip. */
  readonly scale: ScaleLinear<number, number>;
}

const SPAN_MARGIN = { left: 52, right: 60 } as const;

export function spanAxis(hubRadiusM: number, tipRadiusM: number, width: number): SpanAxisValue {
  const left = SPAN_MARGIN.left;
  const right = Math.max(left + 40, width - SPAN_MARGIN.right);
  return {
    hubRadiusM,
    tipRadiusM,
    width,
    left,
    right,
    scale: scaleLinear().domain([hubRadiusM, tipRadiusM]).range([left, right]),
  };
}

export const SpanAxisContext = createContext<SpanAxisValue | null>(null);

export function useSpanAxis(): SpanAxisValue {
  const axis = use(SpanAxisContext);
  if (axis === null) throw new Error('A spanwise plot stands outside a SpanAxis');
  return axis;
}
