import type { SpanPoint } from '@tipward/contract';
import type { QuantityKind } from '@tipward/design-model';
import { SpanAxis } from '../plots/span-axis.tsx';
import { SpanPlot } from '../plots/span-plot.tsx';
import { SpanRuler } from '../plots/span-ruler.tsx';
import type { PlotSeries } from '../plots/plot-series.ts';
import type { RecordedItem } from './recorded-item.ts';

interface Quantity {
  readonly key: keyof SpanPoint;
  readonly title: string;
  readonly unit: string;
  readonly quantity: QuantityKind;
}

const QUANTITIES: readonly Quantity[] = [
  { key: 'chordM', title: 'Chord', unit: 'm', quantity: 'chordM' },
  { key: 'twistDeg', title: 'Twist', unit: '°', quantity: 'twistDeg' },
  { key: 'thicknessPct', title: 'Relative thickness', unit: '%', quantity: 'thicknessPct' },
  { key: 'alphaDeg', title: 'Angle of attack α', unit: '°', quantity: 'angleDeg' },
  { key: 'axialInduction', title: 'Axial induction a', unit: '', quantity: 'induction' },
  { key: 'normalForceNM', title: 'Normal force', unit: 'N/m', quantity: 'forceNM' },
];

function points(item: RecordedItem, key: keyof SpanPoint): PlotSeries['points'] {
  return item.evaluation.span.points.map((point) => {
    const value = point[key];
    return [point.radiusM, typeof value === 'number' ? value : null] as const;
  });
}

/** Outline of the blade seen from upwind: leading edge above the pitch axis, trailing edge below. */
function planform(item: RecordedItem, dashed: boolean): PlotSeries[] {
  const edge = (share: number, side: string): PlotSeries => ({
    id: `${item.id}-${side}`,
    label: side === 'leading' ? item.label : '',
    points: item.evaluation.span.points.map((point) => [point.radiusM, share * point.chordM] as const),
    kind: dashed ? 'dashed' : 'solid',
    colorIndex: item.colorIndex,
  });
  return [edge(0.3, 'leading'), edge(-0.7, 'trailing')];
}

/** Planform, geometry and state along the span of each item on one axis, differences from the reference beneath. */
export function SpanPlots({
  items,
  baseId,
  cursorRadiusM,
  onCursor,
}: {
  items: readonly RecordedItem[];
  baseId: string | null;
  cursorRadiusM: number | null;
  onCursor: (radiusM: number) => void;
}) {
  const radii = items.flatMap((item) => item.content.stations.map((station) => station.radiusM));
  const compared = items.length > 1 && baseId !== null;
  return (
    <SpanAxis hubRadiusM={Math.min(...radii)} tipRadiusM={Math.max(...radii)}>
      <SpanPlot
        title="Planform about the pitch axis"
        unit="m"
        quantity="chordM"
        height={90}
        series={items.flatMap((item) => planform(item, compared && item.id === baseId))}
        cursorRadiusM={cursorRadiusM}
        onCursor={onCursor}
      />
      {QUANTITIES.map(({ key, title, unit, quantity }) => (
        <SpanPlot
          key={key}
          title={title}
          unit={unit}
          quantity={quantity}
          height={90}
          series={items.map((item) => ({
            id: item.id,
            label: item.label,
            points: points(item, key),
            kind: compared && item.id === baseId ? ('dashed' as const) : ('solid' as const),
            colorIndex: item.colorIndex,
          }))}
          cursorRadiusM={cursorRadiusM}
          onCursor={onCursor}
          {...(compared ? { differenceBaseId: baseId } : {})}
        />
      ))}
      <SpanRuler cursorRadiusM={cursorRadiusM} />
    </SpanAxis>
  );
}
