import { useMemo } from 'react';
import type { ReactNode } from 'react';
import { SpanAxisContext, spanAxis } from './span-axis-context.ts';
import { useWidth } from './use-width.ts';

/** Measures its own width and gives everything spanwise within it one pixel axis. */
export function SpanAxis({
  hubRadiusM,
  tipRadiusM,
  children,
}: {
  hubRadiusM: number;
  tipRadiusM: number;
  children: ReactNode;
}) {
  const [element, width] = useWidth<HTMLDivElement>(640);
  const axis = useMemo(() => spanAxis(hubRadiusM, tipRadiusM, width), [hubRadiusM, tipRadiusM, width]);
  return (
    <div ref={element} className="min-w-0">
      <SpanAxisContext value={axis}>{children}</SpanAxisContext>
    </div>
  );
}
