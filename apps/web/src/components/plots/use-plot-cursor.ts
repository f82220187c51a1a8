import type { ScaleLinear } from 'd3-scale';
import type { KeyboardEvent, PointerEvent } from 'react';

export interface PlotCursor {
  readonly x: number | null;
  readonly onCursor: ((x: number) => void) | undefined;
  readonly scale: ScaleLinear<number, number>;
  /** Step of an arrow key, in units of x; Shift takes ten. */
  readonly step: number;
  /** Hover moves the cursor; else it takes a press or a drag. */
  readonly follows: 'hover' | 'drag';
}

const within = (value: number, low: number, high: number) => Math.min(high, Math.max(low, value));

const KEY_STEPS: Record<string, number> = { ArrowLeft: -1, ArrowDown: -1, ArrowRight: 1, ArrowUp: 1 };

function keyTarget(event: KeyboardEvent, from: number, low: number, high: number, step: number) {
  if (event.key === 'Home') return low;
  if (event.key === 'End') return high;
  const direction = KEY_STEPS[event.key];
  if (direction === undefined || event.ctrlKey || event.metaKey || event.altKey) return null;
  return within(from + direction * step * (event.shiftKey ? 10 : 1), low, high);
}

/** Pointer and keyboard handlers of a plot's cursor: hover or drag, arrows, Shift + arrows, Home and End. */
export function usePlotCursor({ x, onCursor, scale, step, follows }: PlotCursor) {
  const [low = 0, high = 1] = scale.domain();
  const move = (event: PointerEvent<HTMLElement>) => {
    const box = event.currentTarget.getBoundingClientRect();
    onCursor?.(within(scale.invert(event.clientX - box.left), low, high));
  };
  return {
    onPointerDown: (event: PointerEvent<HTMLElement>) => {
      event.currentTarget.setPointerCapture(event.pointerId);
      move(event);
    },
    onPointerMove: (event: PointerEvent<HTMLElement>) => {
      if (follows === 'hover' || event.buttons === 1) move(event);
    },
    onKeyDown: (event: KeyboardEvent<HTMLElement>) => {
      const target = keyTarget(event, x ?? (low + high) / 2, low, high, step);
      if (target === null || onCursor === undefined) return;
      event.preventDefault();
      onCursor(target);
    },
  };
}
