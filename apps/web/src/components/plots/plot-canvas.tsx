import type { ReactNode, RefObject } from 'react';
import type { PlotCursor } from './use-plot-cursor.ts';
import { usePlotCursor } from './use-plot-cursor.ts';

/** The drawing of a plot; it takes focus as a slider whose value is the cursor, read out in words with units. */
export function PlotCanvas({
  svg,
  label,
  valueText,
  width,
  height,
  cursor,
  children,
}: {
  svg: RefObject<SVGSVGElement | null>;
  label: string;
  valueText: string;
  width: number;
  height: number;
  cursor: PlotCursor;
  children: ReactNode;
}) {
  const handlers = usePlotCursor(cursor);
  const [low = 0, high = 1] = cursor.scale.domain();
  return (
    <div
      role="slider"
      tabIndex={0}
      aria-label={label}
      aria-valuemin={low}
      aria-valuemax={high}
      aria-valuenow={cursor.x ?? low}
      aria-valuetext={valueText}
      className="touch-pan-y cursor-crosshair select-none"
      {...handlers}
    >
      <svg
        ref={svg}
        aria-hidden="true"
        width={width}
        height={height}
        viewBox={`0 0 ${width} ${height}`}
        className="block overflow-visible"
      >
        {children}
      </svg>
    </div>
  );
}
