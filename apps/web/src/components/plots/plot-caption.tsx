import { formatQuantity } from '@tipward/design-model';
import type { QuantityKind } from '@tipward/design-model';
import type { ReactNode } from 'react';
import type { PlotSeries } from './plot-series.ts';
import { seriesColor, seriesDash } from './plot-series.ts';
import { valueAt } from './value-at.ts';

/** A short piece of the line itself, so that pattern and colour are learnt together. */
function LineKey({ series }: { series: PlotSeries }) {
  return (
    <svg width="18" height="8" aria-hidden="true" className="inline-block align-middle">
      <line
        x1="0"
        x2="18"
        y1="4"
        y2="4"
        stroke={seriesColor(series.colorIndex)}
        strokeWidth="2"
        strokeDasharray={seriesDash(series)}
      />
    </svg>
  );
}

function PlotButton({
  label,
  pressed,
  onClick,
  children,
}: {
  label: string;
  pressed?: boolean;
  onClick: () => void;
  children: ReactNode;
}) {
  return (
    <button
      type="button"
      aria-label={label}
      title={label}
      aria-pressed={pressed}
      onClick={onClick}
      className="h-6 min-w-6 cursor-pointer rounded-[2px] px-1 text-[11px] text-[var(--ink-soft)] hover:bg-[var(--panel)] hover:text-[var(--ink)] aria-pressed:text-[var(--ink)] aria-pressed:underline"
    >
      {children}
    </button>
  );
}

/** Title and unit of a plot, every line's value at the cursor, and what can be done with the plot. */
export function PlotCaption({
  title,
  unit,
  series,
  cursorX,
  quantity,
  asTable,
  onTable,
  onExport,
  heading,
}: {
  title: string;
  unit: string;
  series: readonly PlotSeries[];
  cursorX: number | null;
  quantity: QuantityKind;
  asTable: boolean;
  onTable: () => void;
  onExport: () => void;
  /** Stands in place of the title: a choice of what is plotted, say. */
  heading?: ReactNode;
}) {
  return (
    <figcaption className="flex h-6 items-center gap-3 overflow-hidden text-xs whitespace-nowrap">
      <span className="font-medium">
        {heading ?? title}
        {unit !== '' && <span className="font-normal text-[var(--ink-soft)]">, {unit}</span>}
      </span>
      <span className="ml-auto flex gap-3 overflow-hidden font-mono tabular-nums">
        {cursorX !== null &&
          // What is in hand reads first: it is the last to be cut off where room is short.
          series
            .toSorted((a, b) => Number(b.kind === 'solid') - Number(a.kind === 'solid'))
            .map((line) => (
              <span key={line.id} title={line.label}>
                <LineKey series={line} /> {formatQuantity(quantity, valueAt(line.points, cursorX))}
              </span>
            ))}
      </span>
      <span className="flex shrink-0 print:hidden">
        <PlotButton label={`Show ${title} as a table`} pressed={asTable} onClick={onTable}>
          table
        </PlotButton>
        {!asTable && (
          <PlotButton label={`Save ${title} as SVG`} onClick={onExport}>
            svg
          </PlotButton>
        )}
      </span>
    </figcaption>
  );
}
