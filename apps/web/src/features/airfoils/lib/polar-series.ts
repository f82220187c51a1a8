import type { PolarData } from '@tipward/contract';
import { formatQuantity } from '@tipward/design-model';
import type { PlotSeries } from '../../../components/plots/plot-series.ts';

/** '1.5 M', '400 k': Reynolds numbers as they are said. */
export function reynoldsText(reynolds: number): string {
  return reynolds >= 1e6
    ? `${String(Number((reynolds / 1e6).toPrecision(3)))} M`
    : `${String(Number((reynolds / 1e3).toPrecision(3)))} k`;
}

export const polarName = (polar: PolarData): string =>
  `Re ${reynoldsText(polar.reynolds)}${polar.surfaceState === 'soiled' ? ' soiled' : ''}`;

export const exactReynolds = (reynolds: number): string => formatQuantity('reynolds', reynolds);

/** Lines over the angle of attack: clean solid, soiled dashed, one colour a Reynolds number. */
export function polarSeries(
  polars: readonly PolarData[],
  value: (polar: PolarData, i: number) => number | null,
): PlotSeries[] {
  const numbers = [...new Set(polars.map(({ reynolds }) => reynolds))].toSorted((a, b) => a - b);
  return polars.map((polar) => ({
    id: polarName(polar),
    label: polarName(polar),
    kind: polar.surfaceState === 'soiled' ? 'dashed' : 'solid',
    colorIndex: numbers.indexOf(polar.reynolds),
    points: polar.alphaDeg.map((alpha, i) => [alpha, value(polar, i)] as const),
  }));
}
