import type { Airfoil, PolarData } from '@tipward/contract';
import { useState } from 'react';
import { CurvePlot } from '../../../components/plots/curve-plot.tsx';
import { FieldGrid } from '../../../components/ui/form/field-grid.tsx';
import { Select } from '../../../components/ui/select.tsx';
import { polarSeries } from '../lib/polar-series.ts';

const RANGES = {
  working: { label: 'working range, −10° to 20°', domain: [-10, 20] },
  whole: { label: 'whole circle, −180° to 180°', domain: [-180, 180] },
} as const;
type Range = keyof typeof RANGES;

const SURFACES = [
  { value: 'both', label: 'clean and soiled' },
  { value: 'clean', label: 'clean' },
  { value: 'soiled', label: 'soiled' },
];

const PLOTS: readonly { title: string; value: (polar: PolarData, i: number) => number | null }[] = [
  { title: 'Lift coefficient cl', value: (polar, i) => polar.cl[i] ?? null },
  { title: 'Drag coefficient cd', value: (polar, i) => polar.cd[i] ?? null },
  {
    title: 'Glide ratio cl/cd',
    value: (polar, i) => {
      const drag = polar.cd[i] ?? 0;
      return drag > 0 ? (polar.cl[i] ?? 0) / drag : null;
    },
  },
];

/** What falls outside the plot is left out, so that the scale fits what is looked at. */
function within(polar: PolarData, [from, to]: readonly [number, number]): PolarData {
  const kept = polar.alphaDeg.flatMap((alpha, i) => (alpha >= from && alpha <= to ? [i] : []));
  const pick = (column: number[]) => kept.map((i) => column[i] ?? 0);
  return { ...polar, alphaDeg: pick(polar.alphaDeg), cl: pick(polar.cl), cd: pick(polar.cd) };
}

/** Coefficients over the angle of attack, one cursor through all of them. */
export function PolarPlots({ airfoil }: { airfoil: Airfoil }) {
  const [range, setRange] = useState<Range>('working');
  const [surface, setSurface] = useState('both');
  const [alpha, setAlpha] = useState<number | null>(null);
  const shown = airfoil.polars
    .filter(({ surfaceState }) => surface === 'both' || surfaceState === surface)
    .map((polar) => within(polar, RANGES[range].domain));
  return (
    <div className="flex flex-col gap-5 pr-8">
      <div className="no-print max-w-xl">
        <FieldGrid>
          <Select
            label="Angle of attack"
            value={range}
            options={(Object.keys(RANGES) as Range[]).map((value) => ({ value, label: RANGES[value].label }))}
            onChange={(event) => {
              setRange(event.target.value === 'whole' ? 'whole' : 'working');
            }}
          />
          <Select
            label="Surface"
            value={surface}
            options={SURFACES}
            onChange={(event) => {
              setSurface(event.target.value);
            }}
          />
        </FieldGrid>
      </div>
      {shown.length === 0 && <p className="m-0 text-ink-soft">No polar for this surface.</p>}
      {shown.length > 0 &&
        PLOTS.map(({ title, value }) => (
          <CurvePlot
            key={title}
            title={title}
            unit=""
            quantity="coefficient"
            xTitle="Angle of attack α"
            xUnit="°"
            xQuantity="angleDeg"
            xSymbol="α"
            series={polarSeries(shown, value)}
            cursorX={alpha}
            onCursor={setAlpha}
            step={range === 'whole' ? 5 : 0.5}
            xDomain={RANGES[range].domain}
          />
        ))}
    </div>
  );
}
