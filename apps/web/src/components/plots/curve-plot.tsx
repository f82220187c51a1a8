import { formatQuantity } from '@tipward/design-model';
import type { QuantityKind } from '@tipward/design-model';
import { scaleLinear } from 'd3-scale';
import { useMemo, useRef, useState } from 'react';
import type { ReactNode } from 'react';
import { ArgumentAxis } from './argument-axis.tsx';
import { CursorLayer } from './cursor-layer.tsx';
import { CurveMarks } from './curve-marks.tsx';
import { DIFFERENCE_PX, DifferenceStrip } from './difference-strip.tsx';
import { differencesFrom } from './differences.ts';
import { downloadText, fileStem, standaloneSvg } from './export-svg.ts';
import { LimitLines } from './limit-lines.tsx';
import { PlotCanvas } from './plot-canvas.tsx';
import { PlotCaption } from './plot-caption.tsx';
import { PlotLines } from './plot-lines.tsx';
import type { PlotLimit, PlotMark, PlotSeries } from './plot-series.ts';
import { PlotTable } from './plot-table.tsx';
import { readout } from './readout.ts';
import { useWidth } from './use-width.ts';
import { ValueAxis } from './value-axis.tsx';
import { argumentDomain, valueDomain } from './value-domain.ts';

export interface CurvePlotProps {
  readonly title: string;
  readonly unit: string;
  readonly quantity: QuantityKind;
  /** What runs to the right: 'Tip-speed ratio λ' with '', 'Wind speed' with 'm/s'. */
  readonly xTitle: string;
  readonly xUnit: string;
  readonly xQuantity: QuantityKind;
  /** Short symbol of x in readouts: 'λ', 'V'. */
  readonly xSymbol: string;
  readonly series: readonly PlotSeries[];
  /** The operating cursor; null when none is picked. */
  readonly cursorX: number | null;
  readonly onCursor?: (x: number) => void;
  /** Step of an arrow key, in units of x. */
  readonly step?: number;
  readonly marks?: readonly PlotMark[];
  readonly limits?: readonly PlotLimit[];
  readonly differenceBaseId?: string;
  readonly height?: number;
  readonly includeZero?: boolean;
  readonly xDomain?: readonly [number, number];
  /** Stands in place of the title. */
  readonly heading?: ReactNode;
}

const MARGIN = { left: 52, right: 48, top: 8, bottom: 34 } as const;
const NO_MARKS: readonly PlotMark[] = [];
const NO_LIMITS: readonly PlotLimit[] = [];

/** A rotor-level curve with its operating cursor, which press, drag or arrow keys move. */
export function CurvePlot(props: CurvePlotProps) {
  const { title, unit, quantity, xTitle, xUnit, xQuantity, xSymbol, series, cursorX, differenceBaseId } =
    props;
  const { onCursor, step = 0.1, height = 220, includeZero = true, xDomain, heading } = props;
  const { marks = NO_MARKS, limits = NO_LIMITS } = props;
  const [element, width] = useWidth<HTMLElement>(400);
  const svg = useRef<SVGSVGElement>(null);
  const [asTable, setAsTable] = useState(false);
  const differences = useMemo(() => differencesFrom(series, differenceBaseId), [series, differenceBaseId]);
  const strip = differences.length > 0 ? DIFFERENCE_PX + 4 : 0;
  const bottom = height - MARGIN.bottom - strip;
  const right = width - MARGIN.right;
  const x = useMemo(
    () =>
      scaleLinear()
        .domain(xDomain ?? argumentDomain(series))
        .range([MARGIN.left, right]),
    [series, xDomain, right],
  );
  const y = useMemo(() => {
    const extras = [...marks.map((mark) => mark.y), ...limits.map((limit) => limit.value)];
    return scaleLinear()
      .domain(valueDomain(series, { includeZero, extra: extras }))
      .range([bottom, MARGIN.top]);
  }, [series, marks, limits, includeZero, bottom]);
  const named = `${title}${unit === '' ? '' : `, ${unit}`}`;
  const place =
    cursorX === null
      ? ''
      : `${xSymbol} ${formatQuantity(xQuantity, cursorX)}${xUnit === '' ? '' : ` ${xUnit}`}`;
  return (
    <figure ref={element} className="m-0 min-w-0" aria-label={`${named}, over ${xTitle}`}>
      <PlotCaption
        title={title}
        unit={unit}
        series={series}
        cursorX={cursorX}
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
          xTitle={`${xTitle}${xUnit === '' ? '' : `, ${xUnit}`}`}
          xQuantity={xQuantity}
          quantity={quantity}
          series={series}
        />
      ) : (
        <PlotCanvas
          svg={svg}
          label={`${named}: operating cursor, ${xTitle}`}
          valueText={readout(place, cursorX, series, quantity, unit)}
          width={width}
          height={height}
          cursor={{ x: cursorX, onCursor, scale: x, step, follows: 'drag' }}
        >
          <ValueAxis y={y} left={MARGIN.left} right={right} ticks={5} />
          <ArgumentAxis
            x={x}
            top={MARGIN.top}
            bottom={bottom + strip}
            title={`${xTitle}${xUnit === '' ? '' : `, ${xUnit}`}`}
            cursor={cursorX === null ? null : { x: cursorX, text: place }}
          />
          <LimitLines limits={limits} y={y} left={MARGIN.left} right={right} />
          <PlotLines series={series} x={x} y={y} bottomPx={bottom} />
          <CurveMarks marks={marks} x={x} y={y} />
          {differences.length > 0 && (
            <DifferenceStrip differences={differences} x={x} top={bottom + 4} quantity={quantity} />
          )}
          <CursorLayer
            cursorX={cursorX}
            series={series}
            x={x}
            y={y}
            top={MARGIN.top}
            bottom={bottom + strip}
          />
        </PlotCanvas>
      )}
    </figure>
  );
}
