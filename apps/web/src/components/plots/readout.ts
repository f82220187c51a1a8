import { formatQuantity } from '@tipward/design-model';
import type { QuantityKind } from '@tipward/design-model';
import type { PlotSeries } from './plot-series.ts';
import { valueAt } from './value-at.ts';

/** What the cursor reads, in words: 'r 4.210 m: draft 0.512 m, v3 0.520 m'. */
export function readout(
  at: string,
  cursorX: number | null,
  series: readonly PlotSeries[],
  quantity: QuantityKind,
  unit: string,
): string {
  if (cursorX === null) return 'No cursor yet; arrow keys place it';
  const values = series.map((line) => {
    const value = valueAt(line.points, cursorX);
    return value === null
      ? `${line.label} unknown`
      : `${line.label} ${formatQuantity(quantity, value)}${unit === '' ? '' : ` ${unit}`}`;
  });
  return `${at}: ${values.join(', ')}`;
}
