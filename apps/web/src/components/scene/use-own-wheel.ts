import { useEffect } from 'react';
import type { RefObject } from 'react';

/** Leaves the wheel to the page unless Ctrl is held: the canvas then zooms. */
export function useOwnWheel(frame: RefObject<HTMLElement | null>): void {
  useEffect(() => {
    const node = frame.current;
    if (node === null) return;
    const stop = (event: WheelEvent) => {
      if (!event.ctrlKey) event.stopPropagation();
    };
    node.addEventListener('wheel', stop, { capture: true });
    return () => {
      node.removeEventListener('wheel', stop, { capture: true });
    };
  }, [frame]);
}
