import type { BladeSurface } from '@tipward/design-model';
import { Suspense, lazy, useMemo, useRef, useState } from 'react';
import type { PointerEvent } from 'react';
import { useSpanAxis } from '../plots/span-axis-context.ts';
import type { BladeView } from './blade-views.ts';
import { BLADE_VIEWS, BLADE_VIEW_NAMES, spanFraming } from './blade-views.ts';
import { PlanformDrawing } from './planform-drawing.tsx';
import { SceneBoundary } from './scene-boundary.tsx';
import { useOwnWheel } from './use-own-wheel.ts';

const BladeScene = lazy(() => import('./blade-scene.tsx'));

export interface BladePreviewProps {
  readonly surface: BladeSurface;
  readonly reference?: BladeSurface | null;
  readonly stationRadiiM: readonly number[];
  readonly cursorRadiusM: number | null;
  readonly onCursor?: (radiusM: number) => void;
  readonly height?: number;
}

function ViewButtons({ view, onView }: { view: BladeView | null; onView: (view: BladeView) => void }) {
  return (
    <div role="group" aria-label="View of the blade" className="flex flex-wrap print:hidden">
      {BLADE_VIEW_NAMES.map((name) => (
        <button
          key={name}
          type="button"
          aria-pressed={view === name}
          onClick={() => {
            onView(name);
          }}
          className="h-6 cursor-pointer rounded-[2px] px-1.5 text-[11px] text-[var(--ink-soft)] hover:bg-[var(--panel)] hover:text-[var(--ink)] aria-pressed:text-[var(--ink)] aria-pressed:underline"
        >
          {BLADE_VIEWS[name].label}
        </button>
      ))}
    </div>
  );
}

/** The blade on the shared span axis: in 3D, or drawn flat where there is no WebGL, and then it says so. */
export function BladePreview({
  surface,
  reference = null,
  stationRadiiM,
  cursorRadiusM,
  onCursor,
  height = 150,
}: BladePreviewProps) {
  const axis = useSpanAxis();
  const framing = useMemo(() => spanFraming(axis), [axis]);
  const [view, setView] = useState<{ name: BladeView; serial: number; orbited: boolean }>({
    name: 'suction',
    serial: 0,
    orbited: false,
  });
  const frame = useRef<HTMLDivElement>(null);
  useOwnWheel(frame);
  const follow = (event: PointerEvent<HTMLDivElement>) => {
    // The pointer's place is a radius only while the span lies on the axis.
    if (view.orbited || !BLADE_VIEWS[view.name].spanwise || event.buttons !== 0) return;
    const px = event.clientX - event.currentTarget.getBoundingClientRect().left;
    if (px >= axis.left && px <= axis.right) onCursor?.(axis.scale.invert(px));
  };
  const flat = (
    <PlanformDrawing surface={surface} reference={reference} cursorRadiusM={cursorRadiusM} height={height} />
  );
  return (
    <figure className="m-0" aria-label="Blade, root left, tip right">
      <figcaption className="flex min-h-6 flex-wrap items-center justify-between text-xs">
        <span className="font-medium">Blade</span>
        <ViewButtons
          view={view.orbited ? null : view.name}
          onView={(name) => {
            setView((before) => ({ name, serial: before.serial + 1, orbited: false }));
          }}
        />
      </figcaption>
      <SceneBoundary
        fallback={(reason) => (
          <div>
            {flat}
            <p className="pl-[52px] text-xs text-[var(--ink-soft)]">
              3D needs WebGL, which this browser does not give ({reason}). Planform and sections are drawn
              flat.
            </p>
          </div>
        )}
      >
        <div
          ref={frame}
          style={{ height }}
          onPointerMove={follow}
          className="cursor-grab active:cursor-grabbing"
        >
          <Suspense fallback={flat}>
            <BladeScene
              surface={surface}
              reference={reference}
              stationRadiiM={stationRadiiM}
              cursorRadiusM={cursorRadiusM}
              framing={framing}
              view={view.name}
              viewSerial={view.serial}
              onOrbit={() => {
                setView((before) => ({ ...before, orbited: true }));
              }}
            />
          </Suspense>
        </div>
      </SceneBoundary>
    </figure>
  );
}
