import type { DesignContent, Specification } from '@tipward/contract';
import type { AirfoilData, BladeSurface, LiveResult } from '@tipward/design-model';
import { memo, useDeferredValue, useMemo, useState } from 'react';
import type { ReactNode } from 'react';
import type { PlotLimit } from '../../../components/plots/plot-series.ts';
import { SpanAxis } from '../../../components/plots/span-axis.tsx';
import { SpanPlot } from '../../../components/plots/span-plot.tsx';
import { SpanRuler } from '../../../components/plots/span-ruler.tsx';
import { BladePreview } from '../../../components/scene/blade-preview.tsx';
import { useCursor } from '../hooks/use-cursors.ts';
import type { CursorStore } from '../lib/cursor-store.ts';
import { readPlotChoice, writePlotChoice } from '../lib/plot-choice.ts';
import { CHORD, SPAN_QUANTITIES, TWIST } from '../lib/span-quantities.ts';
import type { SpanQuantity } from '../lib/span-quantities.ts';
import type { DrawnReference } from '../lib/studio-series.ts';
import { alphaDomain, spanSeries } from '../lib/studio-series.ts';
import { surfaceOf } from '../lib/surface-of.ts';
import { Pending } from './pending.tsx';

export interface SpanColumnProps {
  readonly specification: Specification;
  readonly content: DesignContent | null;
  readonly airfoils: readonly AirfoilData[] | null;
  readonly live: LiveResult | null;
  readonly current: boolean;
  readonly reference: DrawnReference | null;
  readonly referenceSurface: BladeSurface | null;
  readonly limits: { readonly chord: readonly PlotLimit[] };
  readonly cursors: CursorStore;
  /** What is said over results that are not current. */
  readonly pendingReason: string;
}

const NO_LIMITS: readonly PlotLimit[] = [];
/** Beyond so many stations their dots and rings run into one another. */
const DOTS_SHOWN = 60;
const NO_RADII: readonly number[] = [];

function Plot({
  quantity,
  stations,
  limits = NO_LIMITS,
  choice,
  ...props
}: {
  quantity: SpanQuantity;
  live: LiveResult;
  reference: DrawnReference | null;
  cursors: CursorStore;
  stations?: readonly (readonly [number, number])[] | undefined;
  limits?: readonly PlotLimit[] | undefined;
  choice?: ReactNode;
}) {
  const { live, reference, cursors } = props;
  const cursorRadiusM = useCursor(cursors, (held) => held.radiusM);
  const series = useMemo(
    () => spanSeries(quantity, live, reference, stations),
    [quantity, live, reference, stations],
  );
  const yDomain = useMemo(
    () => (quantity.id === 'alpha' ? alphaDomain(live, reference) : undefined),
    [quantity, live, reference],
  );
  return (
    <SpanPlot
      title={quantity.title}
      unit={quantity.unit}
      quantity={quantity.quantity}
      includeZero={quantity.includeZero}
      series={series}
      cursorRadiusM={cursorRadiusM}
      onCursor={cursors.setRadius}
      height={92}
      limits={limits}
      heading={choice}
      {...(yDomain === undefined ? {} : { yDomain })}
      {...(stations === undefined || stations.length > DOTS_SHOWN ? {} : { stations })}
      {...(reference === null ? {} : { differenceBaseId: 'reference' })}
    />
  );
}

function PlotChooser({
  value,
  slot,
  onChoose,
}: {
  value: string;
  slot: number;
  onChoose: (id: string) => void;
}) {
  return (
    <select
      aria-label={`Quantity of spanwise plot ${slot}`}
      value={value}
      onChange={(event) => {
        onChoose(event.target.value);
      }}
      className="h-6 max-w-48 font-medium rounded-xs border border-rule bg-sheet text-xs text-ink print:hidden"
    >
      {SPAN_QUANTITIES.map((quantity) => (
        <option key={quantity.id} value={quantity.id}>
          {quantity.title}
        </option>
      ))}
    </select>
  );
}

function Ruler({ cursors }: { cursors: CursorStore }) {
  return <SpanRuler cursorRadiusM={useCursor(cursors, (held) => held.radiusM)} />;
}

const Preview = memo(function Preview({
  content,
  surface,
  reference,
  cursors,
}: {
  content: DesignContent;
  surface: BladeSurface;
  reference: BladeSurface | null;
  cursors: CursorStore;
}) {
  const cursorRadiusM = useCursor(cursors, (held) => held.radiusM);
  const radii = useMemo(
    () => (content.stations.length > DOTS_SHOWN ? NO_RADII : content.stations.map((s) => s.radiusM)),
    [content],
  );
  return (
    <BladePreview
      surface={surface}
      reference={reference}
      stationRadiiM={radii}
      cursorRadiusM={cursorRadiusM}
      onCursor={cursors.setRadius}
      height={124}
    />
  );
});

/** Everything spanwise on one pixel axis: the blade, chord, twist and two plots of choice. */
export function SpanColumn(props: SpanColumnProps) {
  const {
    specification,
    content,
    airfoils,
    live,
    current,
    reference,
    referenceSurface,
    limits,
    cursors,
    pendingReason,
  } = props;
  const [choice, setChoice] = useState(readPlotChoice);
  // The blade may come a moment after the curves: it is drawn in what time they leave.
  const lofted = useDeferredValue(content);
  const surface = useMemo(() => surfaceOf(lofted, airfoils), [lofted, airfoils]);
  const chordDots = useMemo(() => content?.stations.map((s) => [s.radiusM, s.chordM] as const), [content]);
  const twistDots = useMemo(() => content?.stations.map((s) => [s.radiusM, s.twistDeg] as const), [content]);
  const choose = (slot: number, id: string) => {
    const next = choice.map((held, i) => (i === slot ? id : held));
    setChoice(next);
    writePlotChoice(next);
  };
  const shared = { reference, cursors };
  return (
    <section aria-label="Along the span" className="min-h-0 min-w-0 xl:overflow-x-hidden xl:overflow-y-auto">
      <SpanAxis hubRadiusM={specification.hubRadiusM} tipRadiusM={specification.tipRadiusM}>
        {surface !== null && lofted !== null && (
          <Preview content={lofted} surface={surface} reference={referenceSurface} cursors={cursors} />
        )}
        {live !== null && (
          <Pending current={current} reason={pendingReason}>
            <Plot {...shared} live={live} quantity={CHORD} stations={chordDots} limits={limits.chord} />
            <Plot {...shared} live={live} quantity={TWIST} stations={twistDots} />
            {choice.map((id, slot) => {
              const quantity = SPAN_QUANTITIES.find((each) => each.id === id);
              return quantity === undefined ? null : (
                <Plot
                  key={slot}
                  {...shared}
                  live={live}
                  quantity={quantity}
                  choice={
                    <PlotChooser
                      value={id}
                      slot={slot + 1}
                      onChoose={(chosen) => {
                        choose(slot, chosen);
                      }}
                    />
                  }
                />
              );
            })}
          </Pending>
        )}
        {live === null && (
          <p role="status" className="m-0 animate-appear py-4 pl-[52px] text-[13px] text-ink-soft">
            {pendingReason}
          </p>
        )}
        <Ruler cursors={cursors} />
      </SpanAxis>
    </section>
  );
}
