import { useLayoutEffect, useRef, useState } from 'react';
import type { RefObject } from 'react';

/** Width of an element in whole pixels, followed as it changes; `initial` until it is first measured. */
export function useWidth<E extends HTMLElement>(initial: number): [RefObject<E | null>, number] {
  const element = useRef<E>(null);
  const [width, setWidth] = useState(initial);
  useLayoutEffect(() => {
    const node = element.current;
    if (node === null) return;
    const measure = () => {
      const measured = Math.floor(node.getBoundingClientRect().width);
      // An element that is not laid out (a hidden tab, a test without layout) keeps its last width.
      if (measured > 0) setWidth(measured);
    };
    measure();
    if (typeof ResizeObserver === 'undefined') return;
    const observer = new ResizeObserver(measure);
    observer.observe(node);
    return () => {
      observer.disconnect();
    };
  }, []);
  return [element, width];
}
