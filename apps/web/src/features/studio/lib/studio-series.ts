import type { RotorCurve, SpanPoint, Station } from '@tipward/contract';
import type { LiveResult } from '@tipward/design-model';
import type { PlotMark, PlotSeries } from '../../../components/plots/plot-series.ts';
import { formatQuantity } from '@tipward/design-model';
import { valueDomain } from '../../../components/plots/value-domain.ts';
import type { SpanQuantity } from './span-quantities.ts';

const DRAFT = { id: 'draft', label: 'draft', kind: 'solid', colorIndex: 0 } as const;
const REFERENCE = { id: 'reference', kind: 'dashed', colorIndex: 1 } as const;
const STALL = { id: 'stall', label: 'stall', kind: 'dashed', colorIndex: 5, bound: true } as const;

/** A reference to draw beside the draft. */
export interface DrawnReference {
  readonly label: string;
  readonly live: LiveResult;
}

type Points = PlotSeries['points'];

const along = (points: readonly SpanPoint[], pick: (point: SpanPoint) => number | null): Points =>
  points.map((point) => [point.radiusM, pick(point)] as const);

const stallAngle = (point: SpanPoint): number | null =>
  point.alphaDeg === null || point.stallMarginDeg === null ? null : point.alphaDeg + point.stallMarginDeg;

/** Root sections are round: their 'stall' lies far above the plot and says nothing. */
const STALL_SHOWN_PCT = 45;

/** Elements stop short of root and tip; geometry is known there, from the first and the last station. */
function toTheEnds(points: Points, stations: Points | undefined): Points {
  const [first, last] = [stations?.[0], stations?.at(-1)];
  const [from, to] = [points[0], points.at(-1)];
  return [
    ...(first !== undefined && from !== undefined && first[0] < from[0] ? [first] : []),
    ...points,
    ...(last !== undefined && to !== undefined && last[0] > to[0] ? [last] : []),
  ];
}

/** Lines of a spanwise quantity: the draft's, the reference's, and for α the angle of stall. */
export function spanSeries(
  quantity: SpanQuantity,
  draft: LiveResult,
  reference: DrawnReference | null,
  stations?: Points,
): PlotSeries[] {
  const lines: PlotSeries[] = [];
  if (reference !== null)
    lines.push({
      ...REFERENCE,
      label: reference.label,
      points: along(reference.live.span.points, quantity.pick),
    });
  if (quantity.id === 'alpha')
    lines.push({
      ...STALL,
      points: along(draft.span.points, (point) =>
        point.thicknessPct > STALL_SHOWN_PCT ? null : stallAngle(point),
      ),
    });
  lines.push({ ...DRAFT, points: toTheEnds(along(draft.span.points, quantity.pick), stations) });
  return lines;
}

/** Range of α that matters: that of the sections that lift; round roots stand far above it and would flatten the rest. */
export function alphaDomain(draft: LiveResult, reference: DrawnReference | null): [number, number] {
  const lifting = [...draft.span.points, ...(reference?.live.span.points ?? [])].filter(
    (point) => point.thicknessPct <= STALL_SHOWN_PCT,
  );
  const points = lifting.map((point) => [point.radiusM, point.alphaDeg] as const);
  const stall = lifting.map((point) => [point.radiusM, stallAngle(point)] as const);
  return valueDomain([{ ...DRAFT, points: [...points, ...stall] }], { includeZero: true });
}

export type RotorCoefficient = 'cp' | 'ct';

const over = (curve: RotorCurve, coefficient: RotorCoefficient): Points =>
  curve.tipSpeedRatio.map((lambda, i) => [lambda, curve[coefficient][i] ?? null] as const);

/** CP or CT over λ: the draft's and the reference's. */
export function curveSeries(
  coefficient: RotorCoefficient,
  draft: LiveResult,
  reference: DrawnReference | null,
): PlotSeries[] {
  const own = { ...DRAFT, points: over(draft.curve, coefficient) };
  return reference === null
    ? [own]
    : [{ ...REFERENCE, label: reference.label, points: over(reference.live.curve, coefficient) }, own];
}

/** The maximum of CP (and CT there), named with its numbers; none where the curve has none. */
export function maximumMark(coefficient: RotorCoefficient, live: LiveResult): PlotMark[] {
  const { tipSpeedRatioAtMaxCp: x, maxCp, ctAtMaxCp } = live;
  const y = coefficient === 'cp' ? maxCp : ctAtMaxCp;
  if (x === null || y === null) return [];
  const name = coefficient === 'cp' ? 'CP' : 'CT';
  const label = `${name} ${formatQuantity(coefficient, y)} at λ ${formatQuantity('lambda', x)}`;
  return [{ x, y, label, colorIndex: DRAFT.colorIndex }];
}

/** Row of the station nearest a radius; null without stations or radius. */
export function nearestRow(
  stations: readonly Pick<Station, 'radiusM'>[],
  radiusM: number | null,
): number | null {
  if (radiusM === null || stations.length === 0) return null;
  let best = 0;
  stations.forEach((station, row) => {
    if (Math.abs(station.radiusM - radiusM) < Math.abs((stations[best]?.radiusM ?? Infinity) - radiusM))
      best = row;
  });
  return best;
}
