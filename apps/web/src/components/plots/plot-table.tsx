import { formatQuantity } from '@tipward/design-model';
import type { QuantityKind } from '@tipward/design-model';
import type { PlotSeries } from './plot-series.ts';
import { valueAt } from './value-at.ts';

export interface PlotTableProps {
  readonly caption: string;
  readonly xTitle: string;
  readonly xQuantity: QuantityKind;
  readonly quantity: QuantityKind;
  readonly series: readonly PlotSeries[];
}

/** Arguments of all lines, ascending, each once. */
function tableArguments(series: readonly PlotSeries[]): number[] {
  return [...new Set(series.flatMap((line) => line.points.map(([x]) => x)))].sort((a, b) => a - b);
}

/** The numbers behind a plot, for whoever reads better than they see, or wants the figures. */
export function PlotTable({ caption, xTitle, xQuantity, quantity, series }: PlotTableProps) {
  return (
    <div
      className="max-h-60 overflow-auto border border-[var(--rule)]"
      role="region"
      aria-label={`Table: ${caption}`}
      tabIndex={0}
    >
      <table className="w-full text-right font-mono text-xs tabular-nums">
        <caption className="sr-only">{caption}</caption>
        <thead className="sticky top-0 bg-[var(--panel)] font-sans">
          <tr>
            <th scope="col" className="px-2 py-1 font-medium">
              {xTitle}
            </th>
            {series.map((line) => (
              <th key={line.id} scope="col" className="px-2 py-1 font-medium">
                {line.label}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {tableArguments(series).map((x) => (
            <tr key={x}>
              <th scope="row" className="px-2 font-normal">
                {formatQuantity(xQuantity, x)}
              </th>
              {series.map((line) => (
                <td key={line.id} className="px-2">
                  {formatQuantity(quantity, valueAt(line.points, x))}
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}
