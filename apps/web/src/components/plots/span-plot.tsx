import { formatQuantity } from '@tipward/design-model';
import type { QuantityKind } from '@tipward/design-model';
import { scaleLinear } from 'd3-scale';
import { useId, useMemo, useRef, useState } from 'react';
import type { ReactNode } from 'react';
import { CursorLayer } from './cursor-layer.tsx';
import { DIFFERENCE_PX, DifferenceStrip } from './difference-strip.tsx';
import { differencesFrom } from './differences.ts';
import { downloadText, fileStem, standaloneSvg } from './export-svg.ts';
import { LimitLines } from './limit-lines.tsx';
import { PlotCanvas } from './plot-canvas.tsx';
import { PlotCaption } from './plot-caption.tsx';
import { PlotLines } from './plot-lines.tsx';
import type { PlotLimit, PlotSeries } from './plot-series.ts';
import { PlotTable } from './plot-table.tsx';
import { readout } from './readout.ts';
import { useSpanAxis } from './span-axis-context.ts';
import { SpanGrid } from './span-grid.tsx';
import { StationDots } from './station-dots.tsx';
import { ValueAxis } from './value-axis.tsx';
import { valueDomain } from './value-domain.ts';

export interface SpanPlotProps {
  readonly title: string;
  readonly unit: string;
  readonly quantity: QuantityKind;
  readonly series: readonly PlotSeries[];
  /** Radius of the span cursor (m); null when none is placed. */
  readonly cursorRadiusM: number | null;
  readonly onCursor?: (radiusM: number) => void;
  /** Height of the lines' area (px), the difference strip not counted. */
  readonly height?: number;
  readonly includeZero?: boolean;
  /** Range of the axis; lines are cut off where they leave it. By default all of every line fits. */
  readonly yDomain?: readonly [number, number];
  /** Line all others are held against in the strip beneath. */
  readonly differenceBaseId?: string;
  readonly limits?: readonly PlotLimit[];
  /** The stations themselves, drawn as dots. */
  readonly stations?: readonly (readonly [number, number])[];
  /** Stands in place of the title. */
  readonly heading?: ReactNode;
}

const TOP = 6;
const NO_LIMITS: readonly PlotLimit[] = [];

/** A quantity along the span, on the pixel axis of the SpanAxis around it. */
export function SpanPlot({
  title,
  unit,
  quantity,
  series,
  cursorRadiusM,
  onCursor,
  height = 104,
  includeZero = false,
  yDomain,
  differenceBaseId,
  limits = NO_LIMITS,
  stations,
  heading,
}: SpanPlotProps) {
  const axis = useSpanAxis();
  const svg = useRef<SVGSVGElement>(null);
  const [asTable, setAsTable] = useState(false);
  const clipId = useId();
  const bottom = height - 6;
  const y = useMemo(() => {
    const extras = [...limits.map((limit) => limit.value), ...(stations ?? []).map((dot) => dot[1])];
    return scaleLinear()
      .domain(yDomain ?? valueDomain(series, { includeZero, extra: extras }))
      .range([bottom, TOP]);
  }, [series, includeZero, yDomain, limits, stations, bottom]);
  const differences = useMemo(() => differencesFrom(series, differenceBaseId), [series, differenceBaseId]);
  const total = height + (differences.length > 0 ? DIFFERENCE_PX : 0);
  const named = `${title}${unit === '' ? '' : `, ${unit}`}`;
  const place = cursorRadiusM === null ? '' : `r ${formatQuantity('radiusM', cursorRadiusM)} m`;
  return (
    <figure className="m-0" aria-label={`${named}, along the span`}>
      <PlotCaption
        title={title}
        unit={unit}
        series={series}
        cursorX={cursorRadiusM}
        quantity={quantity}
        asTable={asTable}
        onTable={() => {
          setAsTable(!asTable);
        }}
        onExport={() => {
          if (svg.current !== null)
            downloadText(standaloneSvg(svg.current, named), `${fileStem(title)}.svg`, 'image/svg+xml');
        }}
        heading={heading}
      />
      {asTable ? (
        <PlotTable
          caption={named}
          xTitle="Radius, m"
          xQuantity="radiusM"
          quantity={quantity}
          series={series}
        />
      ) : (
        <PlotCanvas
          svg={svg}
          label={`${named}: span cursor`}
          valueText={readout(place, cursorRadiusM, series, quantity, unit)}
          width={axis.width}
          height={total}
          cursor={{
            x: cursorRadiusM,
            onCursor,
            scale: axis.scale,
            step: (axis.tipRadiusM - axis.hubRadiusM) / 100,
            follows: 'hover',
          }}
        >
          <clipPath id={clipId}>
            <rect x={axis.left - 4} y={0} width={axis.right - axis.left + 8 + 60} height={height} />
          </clipPath>
          <SpanGrid top={TOP} bottom={bottom} />
          <ValueAxis y={y} left={axis.left} right={axis.right} ticks={4} />
          <LimitLines limits={limits} y={y} left={axis.left} right={axis.right} />
          <g clipPath={`url(#${clipId})`}>
            <PlotLines series={series} x={axis.scale} y={y} bottomPx={bottom} />
            {stations !== undefined && <StationDots stations={stations} x={axis.scale} y={y} />}
          </g>
          {differences.length > 0 && (
            <DifferenceStrip differences={differences} x={axis.scale} top={height} quantity={quantity} />
          )}
          <CursorLayer cursorX={cursorRadiusM} series={series} x={axis.scale} y={y} top={0} bottom={total} />
        </PlotCanvas>
      )}
    </figure>
  );
}
