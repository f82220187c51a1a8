import { useState } from 'react';
import { CurvePlot } from '../plots/curve-plot.tsx';
import type { PlotSeries } from '../plots/plot-series.ts';
import type { RecordedItem } from './recorded-item.ts';

interface Props {
  readonly items: readonly RecordedItem[];
  /** The reference, drawn dashed; null where nothing is compared. */
  readonly baseId: string | null;
  readonly tipSpeedRatio: number | null;
  readonly onTipSpeedRatio: (lambda: number) => void;
}

type Points = (item: RecordedItem) => readonly (readonly [number, number | null])[];

function seriesOf(items: readonly RecordedItem[], baseId: string | null, pick: Points): PlotSeries[] {
  return items.map((item) => ({
    id: item.id,
    label: item.label,
    points: pick(item),
    kind: item.id === baseId && items.length > 1 ? 'dashed' : 'solid',
    colorIndex: item.colorIndex,
  }));
}

/** CP or CT against tip-speed ratio, each with its maximum marked, differences beneath. */
export function CoefficientPlot({ items, baseId, tipSpeedRatio, onTipSpeedRatio }: Props) {
  const [which, setWhich] = useState<'cp' | 'ct'>('cp');
  const series = seriesOf(items, baseId, ({ evaluation: { curve } }) =>
    curve.tipSpeedRatio.map((lambda, i) => [lambda, curve[which][i] ?? null] as const),
  );
  const marks = items.flatMap(({ evaluation, colorIndex, label }) => {
    const { maxCp, tipSpeedRatioAtMaxCp } = evaluation.keyNumbers;
    if (which === 'ct' || maxCp === null || tipSpeedRatioAtMaxCp === null) return [];
    return [
      {
        x: tipSpeedRatioAtMaxCp,
        y: maxCp,
        label: items.length > 1 ? label : `CP ${maxCp.toFixed(4)}`,
        colorIndex,
      },
    ];
  });
  return (
    <div className="min-w-0">
      <button
        type="button"
        className="link min-h-6 cursor-pointer border-0 bg-transparent text-xs"
        onClick={() => {
          setWhich(which === 'cp' ? 'ct' : 'cp');
        }}
      >
        {which === 'cp' ? 'show CT' : 'show CP'}
      </button>
      <CurvePlot
        title={which === 'cp' ? 'Power coefficient CP' : 'Thrust coefficient CT'}
        unit=""
        quantity={which}
        xTitle="Tip-speed ratio λ"
        xUnit=""
        xQuantity="lambda"
        xSymbol="λ"
        series={series}
        marks={items.length > 2 ? [] : marks}
        cursorX={tipSpeedRatio}
        onCursor={onTipSpeedRatio}
        {...(baseId !== null && items.length > 1 ? { differenceBaseId: baseId } : {})}
      />
    </div>
  );
}

const WIND_PLOTS = [
  { key: 'electricalPowerKW', title: 'Electrical power', unit: 'kW', quantity: 'powerKW' },
  { key: 'thrustKN', title: 'Rotor thrust', unit: 'kN', quantity: 'thrustKN' },
  { key: 'rootFlapMomentKNm', title: 'Root flapwise moment', unit: 'kN·m', quantity: 'momentKNm' },
  { key: 'pitchDeg', title: 'Pitch', unit: '°', quantity: 'angleDeg' },
  { key: 'rotorSpeedRpm', title: 'Rotor speed', unit: 'rpm', quantity: 'speedRpm' },
] as const;

/** Schedule quantities against wind speed, with a cursor of their own. */
export function WindPlots({ items, baseId }: Pick<Props, 'items' | 'baseId'>) {
  const [wind, setWind] = useState<number | null>(null);
  return (
    <div className="grid gap-6 lg:grid-cols-2">
      {WIND_PLOTS.map(({ key, title, unit, quantity }) => (
        <CurvePlot
          key={key}
          title={title}
          unit={unit}
          quantity={quantity}
          xTitle="Wind speed"
          xUnit="m/s"
          xQuantity="speedMS"
          xSymbol="V"
          height={150}
          step={0.5}
          series={seriesOf(items, baseId, ({ evaluation }) =>
            evaluation.schedule.map((point) => [point.windSpeedMS, point[key]] as const),
          )}
          cursorX={wind}
          onCursor={setWind}
          {...(baseId !== null && items.length > 1 ? { differenceBaseId: baseId } : {})}
        />
      ))}
    </div>
  );
}
